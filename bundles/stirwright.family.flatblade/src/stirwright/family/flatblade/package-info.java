/**
 * Open flat-blade turbines and flat paddles. {@link stirwright.family.flatblade.FlatBlade} is the
 * service that the workbench finds; the other classes hold its table entries, one method each. The
 * equations over all regimes hold for pitched paddles too and stand in {@code stirwright.general}.
 */
package stirwright.family.flatblade;
