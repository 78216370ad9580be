package stirwright.rheology;

/** The limits that several models share. */
final class Checks {

	/**
	 * Largest flow index of the power law and its relatives. A guard against swapped columns, wide enough for
	 * shear-thickening suspensions; common practice, no source.
	 */
	static final double MAX_FLOW_INDEX = 2;

	private Checks() {
	}

	static double shearRate(double value) {
		if (!(value > 0 && value < Double.POSITIVE_INFINITY)) {
			throw new IllegalArgumentException("shear rate = " + value + " 1/s: must be a finite number greater than 0");
		}
		return value;
	}

	static void positive(String parameter, double value) {
		require(value > 0 && Double.isFinite(value), parameter, value, "must be a finite number greater than 0");
	}

	static void notNegative(String parameter, double value) {
		require(value >= 0 && Double.isFinite(value), parameter, value, "must be a finite number, 0 or greater");
	}

	static void flowIndex(double value) {
		require(value > 0 && value <= MAX_FLOW_INDEX, "flow_index", value, "must be greater than 0 and at most 2");
	}

	/** The limits of the models with a plateau at each end. */
	static void plateaus(double zeroShear, double infiniteShear, double timeConstant, double flowIndex) {
		positive("zero_shear_viscosity", zeroShear);
		if (!(infiniteShear >= 0 && infiniteShear <= zeroShear)) {
			throw new ParameterException("infinite_shear_viscosity", infiniteShear,
					"must be from 0 to the zero-shear viscosity, which is " + zeroShear);
		}
		notNegative("time_constant", timeConstant);
		thinningIndex(flowIndex);
	}

	/** The flow index of a model that ends in a plateau. */
	static void thinningIndex(double value) {
		require(value > 0 && value <= 1, "flow_index", value,
				"must be greater than 0 and at most 1 for a model with a plateau");
	}

	private static void require(boolean holds, String parameter, double value, String allowed) {
		if (!holds) {
			throw new ParameterException(parameter, value, allowed);
		}
	}
}
