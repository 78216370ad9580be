package stirwright.rheology;

/**
 * Between what the yield stress of a product may lie: different models, ramps and instruments rarely agree on it. Either
 * end may be unknown; an unknown end is NaN.
 *
 * @param low  Pa, 0 or greater, or NaN
 * @param high Pa, 0 or greater and not below {@code low}, or NaN
 */
public record YieldBounds(double low, double high) {

	/** Nothing is known but the yield stress itself. */
	public static final YieldBounds UNKNOWN = new YieldBounds(Double.NaN, Double.NaN);

	/** How refusals call the two ends. */
	static final String LOW = "yield_stress_low";
	static final String HIGH = "yield_stress_high";

	/** @throws ParameterException {@code yield_stress_low} or {@code yield_stress_high}, if an end is out of its limits */
	public YieldBounds {
		if (!Double.isNaN(low)) {
			Checks.notNegative(LOW, low);
		}
		if (!Double.isNaN(high)) {
			Checks.notNegative(HIGH, high);
		}
		if (high < low) {
			throw new ParameterException(HIGH, high, "must not be below yield_stress_low, which is " + low);
		}
	}

	/** Whether at least one end is known. */
	public boolean known() {
		return !Double.isNaN(low) || !Double.isNaN(high);
	}

	/** Refuses bounds that do not hold the yield stress of a model, or that stand beside a model without one. */
	void check(FluidModel model) {
		if (!known()) {
			return;
		}
		if (!ModelKind.of(model).parameters().contains(ModelParameters.YIELD_STRESS)) {
			boolean first = !Double.isNaN(low);
			throw new ParameterException(first ? LOW : HIGH, first ? low : high,
					"must be left out: the model " + model.id() + " has no yield stress");
		}
		double between = model.yieldStress();
		if (low > between) {
			throw new ParameterException(LOW, low, "must not be above the yield stress, which is " + between);
		}
		if (high < between) {
			throw new ParameterException(HIGH, high, "must not be below the yield stress, which is " + between);
		}
	}
}
