/**
 * Anchors and gates. {@link stirwright.family.anchor.Anchors} is the service that the workbench
 * finds; the other classes hold the correlations, one method each.
 */
package stirwright.family.anchor;
