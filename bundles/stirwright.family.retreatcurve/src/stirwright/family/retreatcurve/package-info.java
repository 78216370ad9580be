/**
 * Retreat-curve impellers. {@link stirwright.family.retreatcurve.RetreatCurve} is the service that the
 * workbench finds; the other classes hold its correlations, one method each.
 */
package stirwright.family.retreatcurve;
