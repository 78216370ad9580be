package stirwright.rheology;

/**
 * Bingham's plastic: stress = yieldStress + plasticViscosity * rate. E. C. Bingham, Fluidity and Plasticity (1922);
 * citation from memory, locator not at hand.
 *
 * @param yieldStress      Pa, 0 or greater
 * @param plasticViscosity Pa s, greater than 0
 */
public record Bingham(double yieldStress, double plasticViscosity) implements FluidModel {

	/** @throws ParameterException if a parameter is out of its limits */
	public Bingham {
		Checks.notNegative("yield_stress", yieldStress);
		Checks.positive("plastic_viscosity", plasticViscosity);
	}

	@Override
	public double stress(double shearRate) {
		return yieldStress + plasticViscosity * Checks.shearRate(shearRate);
	}

	@Override
	public double apparentViscosity(double shearRate) {
		return yieldStress / Checks.shearRate(shearRate) + plasticViscosity;
	}

	@Override
	public double flowIndex(double shearRate) {
		return plasticViscosity / apparentViscosity(shearRate);
	}
}
