package stirwright.rheology;

/**
 * Carreau's model, a plateau at each end: viscosity = infinite + (zero - infinite) * (1 + (timeConstant *
 * rate)^2)^((n - 1) / 2). P. J. Carreau, Transactions of the Society of Rheology 16 (1972) 99; citation from memory.
 *
 * @param zeroShearViscosity     Pa s, greater than 0
 * @param infiniteShearViscosity Pa s, from 0 to the zero-shear viscosity
 * @param timeConstant           s, 0 or greater; at 0 the model is {@link Newtonian}
 * @param flowIndex              n, dimensionless, greater than 0 and at most 1; at 1 the model is {@link Newtonian}
 */
public record Carreau(double zeroShearViscosity, double infiniteShearViscosity, double timeConstant, double flowIndex)
		implements FluidModel {

	/** @throws ParameterException if a parameter is out of its limits */
	public Carreau {
		Checks.plateaus(zeroShearViscosity, infiniteShearViscosity, timeConstant, flowIndex);
	}

	@Override
	public double stress(double shearRate) {
		return shearRate * apparentViscosity(shearRate);
	}

	@Override
	public double apparentViscosity(double shearRate) {
		return infiniteShearViscosity
				+ (zeroShearViscosity - infiniteShearViscosity) / thinning(timeConstant * Checks.shearRate(shearRate));
	}

	@Override
	public double flowIndex(double shearRate) {
		double reducedRate = timeConstant * Checks.shearRate(shearRate);
		double range = zeroShearViscosity - infiniteShearViscosity;
		double thinningShare = range / (range + infiniteShearViscosity * thinning(reducedRate));
		// x / sqrt(1 + x^2), written so that it holds for x = 0 and for an x whose square overflows.
		double slope = 1 / Math.hypot(1, 1 / reducedRate);
		return 1 - (1 - flowIndex) * thinningShare * slope * slope;
	}

	/** (1 + x^2)^((1 - n) / 2); hypot keeps x^2 from overflowing. */
	private double thinning(double reducedRate) {
		return Math.pow(Math.hypot(1, reducedRate), 1 - flowIndex);
	}
}
