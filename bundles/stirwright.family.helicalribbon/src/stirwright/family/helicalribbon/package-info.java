/**
 * Helical ribbons. {@link stirwright.family.helicalribbon.HelicalRibbon} is the service that the
 * workbench finds; the other classes hold its correlations, one method each.
 */
package stirwright.family.helicalribbon;
