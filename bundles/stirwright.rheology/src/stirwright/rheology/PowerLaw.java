package stirwright.rheology;

/**
 * Ostwald and de Waele's power law: stress = consistency * rate^flowIndex. Textbook definition, locator not at hand.
 *
 * <p>Not for rates far outside the measured ones: the viscosity has no plateau at either end.
 *
 * @param consistency Pa s^n, greater than 0
 * @param flowIndex   dimensionless, greater than 0 and at most 2
 */
public record PowerLaw(double consistency, double flowIndex) implements FluidModel {

	/** @throws ParameterException if a parameter is out of its limits */
	public PowerLaw {
		Checks.positive("consistency", consistency);
		Checks.flowIndex(flowIndex);
	}

	@Override
	public double stress(double shearRate) {
		return consistency * Math.pow(Checks.shearRate(shearRate), flowIndex);
	}

	@Override
	public double apparentViscosity(double shearRate) {
		return consistency * Math.pow(Checks.shearRate(shearRate), flowIndex - 1);
	}

	@Override
	public double flowIndex(double shearRate) {
		Checks.shearRate(shearRate);
		return flowIndex;
	}
}
