package stirwright.rheology;

/**
 * Herschel and Bulkley's yield power law: stress = yieldStress + consistency * rate^flowIndex. W. H. Herschel and
 * R. Bulkley, Kolloid-Zeitschrift 39 (1926) 291; citation from memory.
 *
 * @param yieldStress Pa, 0 or greater; at 0 the model is the {@link PowerLaw}
 * @param consistency Pa s^n, greater than 0
 * @param flowIndex   dimensionless, greater than 0 and at most 2; at 1 the model is {@link Bingham}'s
 */
public record HerschelBulkley(double yieldStress, double consistency, double flowIndex) implements FluidModel {

	/** @throws ParameterException if a parameter is out of its limits */
	public HerschelBulkley {
		Checks.notNegative("yield_stress", yieldStress);
		Checks.positive("consistency", consistency);
		Checks.flowIndex(flowIndex);
	}

	@Override
	public double stress(double shearRate) {
		return yieldStress + consistency * Math.pow(Checks.shearRate(shearRate), flowIndex);
	}

	@Override
	public double apparentViscosity(double shearRate) {
		return yieldStress / Checks.shearRate(shearRate) + consistency * Math.pow(shearRate, flowIndex - 1);
	}

	@Override
	public double flowIndex(double shearRate) {
		double viscous = consistency * Math.pow(Checks.shearRate(shearRate), flowIndex);
		// Dividing first keeps the limits: the ratio may go to 0 or to infinity, never to infinity over infinity.
		return yieldStress == 0 ? flowIndex : flowIndex / (1 + yieldStress / viscous);
	}
}
