/**
 * Pitched-blade turbines. {@link stirwright.family.pitchedblade.PitchedBlade} is the service that the
 * workbench finds; the other classes hold its correlations, one method each.
 */
package stirwright.family.pitchedblade;
