package stirwright.rheology;

/**
 * Constant viscosity: stress = viscosity * rate. The definition itself; no source needed.
 *
 * @param viscosity Pa s, greater than 0
 */
public record Newtonian(double viscosity) implements FluidModel {

	/** @throws ParameterException if the viscosity is out of its limits */
	public Newtonian {
		Checks.positive("viscosity", viscosity);
	}

	@Override
	public double stress(double shearRate) {
		return viscosity * Checks.shearRate(shearRate);
	}

	@Override
	public double apparentViscosity(double shearRate) {
		Checks.shearRate(shearRate);
		return viscosity;
	}

	@Override
	public double flowIndex(double shearRate) {
		Checks.shearRate(shearRate);
		return 1;
	}
}
