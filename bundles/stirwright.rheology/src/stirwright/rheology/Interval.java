package stirwright.rheology;

/**
 * From a low to a high value. An end that the data do not give is NaN.
 *
 * @param low  not above {@code high}
 * @param high in the unit of what it is an interval of
 */
public record Interval(double low, double high) {

	/** Neither end is known. */
	public static final Interval NONE = new Interval(Double.NaN, Double.NaN);

	/** Whether both ends are known. */
	public boolean known() {
		return !Double.isNaN(low) && !Double.isNaN(high);
	}

	/** Whether a value lies in it; no end that is NaN bounds anything. */
	public boolean contains(double value) {
		return !(value < low) && !(value > high);
	}
}
