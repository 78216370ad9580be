/**
 * Disc turbines. {@link stirwright.family.discturbine.DiscTurbine} is the service that the workbench
 * finds; the other classes hold its correlations, one method each.
 */
package stirwright.family.discturbine;
