package stirwright.exchange;

/**
 * A point that is not taken.
 *
 * @param block number from 1
 * @param rate what stands there as shear rate
 * @param stress what stands there as shear stress, or as viscosity without one
 * @param reason one sentence that names the column and the value
 * @param canBePutBack whether shear rate and stress are numbers above 0 all the same
 */
public record DroppedPoint(int block, PointPlace place, String rate, String stress, String reason, boolean canBePutBack) {}
