/**
 * Helical screws. {@link stirwright.family.helicalscrew.HelicalScrew} is the service that the
 * workbench finds; the other classes hold its correlations, one method each.
 */
package stirwright.family.helicalscrew;
