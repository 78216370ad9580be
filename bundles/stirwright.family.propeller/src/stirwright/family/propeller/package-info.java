/**
 * Marine propellers. {@link stirwright.family.propeller.Propeller} is the service that the workbench
 * finds; the other classes hold its correlations, one method each.
 */
package stirwright.family.propeller;
