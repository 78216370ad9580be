package stirwright.rheology;

/**
 * Between what the yield stress of a product may lie: different models, ramps and instruments rarely agree on it. What is
 * unknown is NaN.
 *
 * @param low    Pa, 0 or greater, or NaN
 * @param high   Pa, 0 or greater and not below {@code low}, or NaN
 * @param atRest the static yield stress: what starts the product after rest, measured with a vane or a stress ramp; Pa, 0 or
 *               greater, or NaN. Any model may have it, since a gel may be broken to a liquid without a yield stress
 */
public record YieldBounds(double low, double high, double atRest) {

	/** Nothing is known but the yield stress itself. */
	public static final YieldBounds UNKNOWN = new YieldBounds(Double.NaN, Double.NaN, Double.NaN);

	/** How refusals call them. */
	static final String LOW = "yield_stress_low";
	static final String HIGH = "yield_stress_high";
	static final String AT_REST = "static_yield_stress";

	/**
	 * @throws ParameterException {@code yield_stress_low}, {@code yield_stress_high} or {@code static_yield_stress}, if it is
	 *                            out of its limits
	 */
	public YieldBounds {
		if (!Double.isNaN(low)) {
			Checks.notNegative(LOW, low);
		}
		if (!Double.isNaN(high)) {
			Checks.notNegative(HIGH, high);
		}
		if (!Double.isNaN(atRest)) {
			Checks.notNegative(AT_REST, atRest);
		}
		if (high < low) {
			throw new ParameterException(HIGH, high, "must not be below yield_stress_low, which is " + low);
		}
	}

	/** Bounds of a product that was not measured at rest. */
	public YieldBounds(double low, double high) {
		this(low, high, Double.NaN);
	}

	/** Whether at least one end is known. */
	public boolean known() {
		return !Double.isNaN(low) || !Double.isNaN(high);
	}

	/**
	 * The same with the static yield stress as the higher end, unless a higher one is known.
	 *
	 * @param yieldStress Pa, of the model; a static one below it is no end of a range that must hold it
	 */
	YieldBounds reachingRest(double yieldStress) {
		return atRest >= (Double.isNaN(high) ? yieldStress : high) ? new YieldBounds(low, atRest, atRest) : this;
	}

	/** Refuses ends that do not hold the yield stress of a model, or that stand beside a model without one. */
	void check(FluidModel model) {
		if (!known()) {
			return;
		}
		if (!ModelKind.of(model).yields()) {
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
