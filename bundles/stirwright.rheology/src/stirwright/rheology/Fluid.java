package stirwright.rheology;

import java.util.Objects;

/**
 * A fluid as a vessel sees it.
 *
 * @param model       stress as a function of shear rate
 * @param density     kg/m3, from 50 to 25000
 * @param window      shear rates between which the model was measured
 * @param yieldBounds between what its yield stress may lie, and what it is after rest
 */
public record Fluid(FluidModel model, double density, MeasuredWindow window, YieldBounds yieldBounds) {

	/** Limits in kg/m3 that catch a wrong unit, not an unusual fluid; common practice, no source. */
	private static final double MIN_DENSITY = 50;
	private static final double MAX_DENSITY = 25_000;

	/** kg/m3 in one g/cm3, by definition of the units. */
	private static final double GRAM_PER_CUBIC_CENTIMETRE = 1000;

	/**
	 * @throws ParameterException {@code density}, if it is out of its limits; {@code yield_stress_low} or
	 *                            {@code yield_stress_high}, if they do not hold the model's yield stress or if it has none
	 */
	public Fluid {
		Objects.requireNonNull(model, "model");
		Objects.requireNonNull(window, "window");
		yieldBounds.check(model);
		if (!plausible(density)) {
			String hint = plausible(density * GRAM_PER_CUBIC_CENTIMETRE)
					? "; the value looks like g/cm3 and must be given in kg/m3"
					: "";
			throw new ParameterException("density", density, "must be from 50 to 25000 kg/m3" + hint);
		}
	}

	/** A fluid of which no more is known about its yield stress than the model says. */
	public Fluid(FluidModel model, double density, MeasuredWindow window) {
		this(model, density, window, YieldBounds.UNKNOWN);
	}

	/** Between what its yield stress may lie, the static one included. */
	public YieldBounds yieldRange() {
		return yieldBounds.reachingRest(model.yieldStress());
	}

	/**
	 * The same fluid with another yield stress in its model, and nothing said about its bounds.
	 *
	 * @param yieldStress Pa, 0 or greater
	 * @throws ParameterException    {@code yield_stress}, if it is not
	 * @throws IllegalStateException if the model has no yield stress
	 */
	public Fluid withYieldStress(double yieldStress) {
		ModelKind kind = ModelKind.of(model);
		int at = kind.parameters().indexOf(ModelParameters.YIELD_STRESS);
		if (at < 0) {
			throw new IllegalStateException("the model " + kind.id() + " has no yield stress");
		}
		double[] values = ModelKind.values(model);
		values[at] = yieldStress;
		return new Fluid(kind.create(values), density, window);
	}

	private static boolean plausible(double density) {
		return density >= MIN_DENSITY && density <= MAX_DENSITY;
	}
}
