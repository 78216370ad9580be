package stirwright.rheology.internal;

/**
 * The stress yieldStress + consistency * rate^flowIndex, and its residual. Nothing is checked here: the values may lie
 * outside any model's limits.
 *
 * @param yieldStress Pa
 * @param consistency Pa s^n
 * @param flowIndex   dimensionless
 * @param residual    sum of squared weighted deviations
 */
public record Solution(double yieldStress, double consistency, double flowIndex, double residual) {

	Solution orBetter(Solution other) {
		return other.residual < residual ? other : this;
	}
}
