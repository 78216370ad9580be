package stirwright.rheology;

/**
 * Casson's model: sqrt(stress) = sqrt(yieldStress) + sqrt(plasticViscosity * rate). N. Casson, in: Rheology of Disperse
 * Systems (1959); citation from memory, locator not at hand.
 *
 * @param yieldStress      Pa, 0 or greater; at 0 the model is {@link Newtonian}
 * @param plasticViscosity Pa s, greater than 0
 */
public record Casson(double yieldStress, double plasticViscosity) implements FluidModel {

	/** @throws ParameterException if a parameter is out of its limits */
	public Casson {
		Checks.notNegative("yield_stress", yieldStress);
		Checks.positive("plastic_viscosity", plasticViscosity);
	}

	@Override
	public double stress(double shearRate) {
		double root = Math.sqrt(yieldStress) + viscousRoot(shearRate);
		return root * root;
	}

	@Override
	public double apparentViscosity(double shearRate) {
		double root = Math.sqrt(yieldStress / Checks.shearRate(shearRate)) + Math.sqrt(plasticViscosity);
		return root * root;
	}

	@Override
	public double flowIndex(double shearRate) {
		double viscous = viscousRoot(shearRate);
		return viscous / (Math.sqrt(yieldStress) + viscous);
	}

	/** Two roots instead of the root of the product: the product of two tiny numbers would be 0. */
	private double viscousRoot(double shearRate) {
		return Math.sqrt(plasticViscosity) * Math.sqrt(Checks.shearRate(shearRate));
	}
}
