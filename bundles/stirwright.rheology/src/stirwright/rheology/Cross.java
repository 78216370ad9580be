package stirwright.rheology;

/**
 * Cross's model, a plateau at each end: viscosity = infinite + (zero - infinite) / (1 + (timeConstant * rate)^(1 - n)).
 * M. M. Cross, Journal of Colloid Science 20 (1965) 417; citation from memory.
 *
 * <p>At n = 1 the viscosity is constant at the mean of the two plateaus, as the formula says; at a time constant of 0
 * and n below 1 it is the zero-shear viscosity.
 *
 * @param zeroShearViscosity     Pa s, greater than 0
 * @param infiniteShearViscosity Pa s, from 0 to the zero-shear viscosity
 * @param timeConstant           s, 0 or greater
 * @param flowIndex              n, dimensionless, greater than 0 and at most 1: the model thins, and its stress rises
 */
public record Cross(double zeroShearViscosity, double infiniteShearViscosity, double timeConstant, double flowIndex)
		implements FluidModel {

	/** @throws ParameterException if a parameter is out of its limits */
	public Cross {
		Checks.plateaus(zeroShearViscosity, infiniteShearViscosity, timeConstant, flowIndex);
	}

	@Override
	public double stress(double shearRate) {
		return shearRate * apparentViscosity(shearRate);
	}

	@Override
	public double apparentViscosity(double shearRate) {
		return infiniteShearViscosity + (zeroShearViscosity - infiniteShearViscosity) / (1 + thinning(shearRate));
	}

	@Override
	public double flowIndex(double shearRate) {
		double thinning = thinning(shearRate);
		double range = zeroShearViscosity - infiniteShearViscosity;
		double thinningShare = range / (range + infiniteShearViscosity * (1 + thinning));
		// 1 / (1 + 1/x) is x / (1 + x) that also holds for x = 0 and for an infinite x.
		return 1 - (1 - flowIndex) * thinningShare / (1 + 1 / thinning);
	}

	private double thinning(double shearRate) {
		return Math.pow(timeConstant * Checks.shearRate(shearRate), 1 - flowIndex);
	}
}
