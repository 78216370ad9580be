package stirwright.rheology;

/**
 * Sisko's model, a power law that ends in a plateau at high shear rates: viscosity = infinite + consistency *
 * rate^(flowIndex - 1). A. W. Sisko, Industrial and Engineering Chemistry 50 (1958) 1789; citation from memory.
 *
 * @param infiniteShearViscosity Pa s, 0 or greater; at 0 the model is the {@link PowerLaw}
 * @param consistency            Pa s^n, greater than 0
 * @param flowIndex              dimensionless, greater than 0 and at most 1; at 1 the model is {@link Newtonian}
 */
public record Sisko(double infiniteShearViscosity, double consistency, double flowIndex) implements FluidModel {

	/** @throws ParameterException if a parameter is out of its limits */
	public Sisko {
		Checks.notNegative("infinite_shear_viscosity", infiniteShearViscosity);
		Checks.positive("consistency", consistency);
		Checks.thinningIndex(flowIndex);
	}

	@Override
	public double stress(double shearRate) {
		return infiniteShearViscosity * Checks.shearRate(shearRate) + consistency * Math.pow(shearRate, flowIndex);
	}

	@Override
	public double apparentViscosity(double shearRate) {
		return infiniteShearViscosity + consistency * Math.pow(Checks.shearRate(shearRate), flowIndex - 1);
	}

	@Override
	public double flowIndex(double shearRate) {
		double power = consistency * Math.pow(Checks.shearRate(shearRate), flowIndex - 1);
		return 1 - (1 - flowIndex) / (1 + infiniteShearViscosity / power);
	}
}
