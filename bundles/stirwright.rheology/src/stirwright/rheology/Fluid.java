package stirwright.rheology;

import java.util.Objects;

/**
 * A fluid as a vessel sees it.
 *
 * @param model   stress as a function of shear rate
 * @param density kg/m3, from 50 to 25000
 * @param window  shear rates between which the model was measured
 */
public record Fluid(FluidModel model, double density, MeasuredWindow window) {

	/** Limits in kg/m3 that catch a wrong unit, not an unusual fluid; common practice, no source. */
	private static final double MIN_DENSITY = 50;
	private static final double MAX_DENSITY = 25_000;

	/** kg/m3 in one g/cm3, by definition of the units. */
	private static final double GRAM_PER_CUBIC_CENTIMETRE = 1000;

	/** @throws ParameterException {@code density}, if it is out of its limits */
	public Fluid {
		Objects.requireNonNull(model, "model");
		Objects.requireNonNull(window, "window");
		if (!plausible(density)) {
			String hint = plausible(density * GRAM_PER_CUBIC_CENTIMETRE)
					? "; the value looks like g/cm3 and must be given in kg/m3"
					: "";
			throw new ParameterException("density", density, "must be from 50 to 25000 kg/m3" + hint);
		}
	}

	private static boolean plausible(double density) {
		return density >= MIN_DENSITY && density <= MAX_DENSITY;
	}
}
