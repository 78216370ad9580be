package stirwright.rheology;

/**
 * The shear rates between which a fluid was measured. Either end may be unknown; an unknown end is NaN and bounds
 * nothing.
 *
 * @param min lower end in 1/s, 0 or greater, or NaN
 * @param max upper end in 1/s, greater than 0 and not below {@code min}, or NaN
 */
public record MeasuredWindow(double min, double max) {

	/** Nothing is known about where the fluid was measured. */
	public static final MeasuredWindow UNKNOWN = new MeasuredWindow(Double.NaN, Double.NaN);

	/** @throws ParameterException {@code shear_rate_min} or {@code shear_rate_max}, if an end is out of its limits */
	public MeasuredWindow {
		if (!Double.isNaN(min)) {
			Checks.notNegative("shear_rate_min", min);
		}
		if (!Double.isNaN(max)) {
			Checks.positive("shear_rate_max", max);
		}
		if (max < min) {
			throw new ParameterException("shear_rate_max", max, "must not be below shear_rate_min, which is " + min);
		}
	}

	/** Whether at least one end is known. */
	public boolean known() {
		return !Double.isNaN(min) || !Double.isNaN(max);
	}

	/**
	 * Whether a rate lies outside no known end; the ends themselves are inside. Ask {@link #known()} first: an unknown
	 * window contains every rate.
	 *
	 * @param rate 1/s, finite and greater than 0
	 */
	public boolean contains(double rate) {
		return decadesOutside(rate) == 0;
	}

	/**
	 * How far a rate lies outside the window, as the decimal logarithm of its ratio to the nearer end; 0 inside.
	 *
	 * @param rate 1/s, finite and greater than 0
	 * @throws IllegalArgumentException if the rate is not
	 */
	public double decadesOutside(double rate) {
		Checks.shearRate(rate);
		if (rate < min) {
			return Math.log10(min) - Math.log10(rate);
		}
		return rate > max ? Math.log10(rate) - Math.log10(max) : 0;
	}
}
