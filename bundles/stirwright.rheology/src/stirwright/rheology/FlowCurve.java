package stirwright.rheology;

import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;

/** Measured points of shear stress against shear rate, sorted by shear rate; at least three. */
public final class FlowCurve {

	private static final int MIN_POINTS = 3;

	private final double[] shearRates;
	private final double[] stresses;

	private FlowCurve(double[] shearRates, double[] stresses) {
		this.shearRates = shearRates;
		this.stresses = stresses;
	}

	/**
	 * Copies the points, sorted by shear rate; points of equal rate keep their order.
	 *
	 * @param shearRates 1/s, each finite and greater than 0
	 * @param stresses   Pa, each finite and greater than 0, as many as there are rates
	 * @throws IllegalArgumentException if there are fewer than three points, if the numbers of rates and stresses
	 *                                  differ, or if a value is out of its limits; the message names the point, the
	 *                                  first being 1
	 */
	public static FlowCurve of(double[] shearRates, double[] stresses) {
		if (shearRates.length != stresses.length) {
			throw new IllegalArgumentException(shearRates.length + " shear rates, but " + stresses.length + " stresses");
		}
		if (shearRates.length < MIN_POINTS) {
			throw new IllegalArgumentException(
					"a flow curve needs at least " + MIN_POINTS + " points, not " + shearRates.length);
		}
		for (int i = 0; i < shearRates.length; i++) {
			check(i, "shear rate", shearRates[i], "1/s");
			check(i, "stress", stresses[i], "Pa");
		}
		if (ascending(shearRates)) {
			return new FlowCurve(shearRates.clone(), stresses.clone());
		}
		int[] order = IntStream.range(0, shearRates.length).boxed()
				.sorted(Comparator.comparingDouble(i -> shearRates[i]))
				.mapToInt(Integer::intValue).toArray();
		return new FlowCurve(
				Arrays.stream(order).mapToDouble(i -> shearRates[i]).toArray(),
				Arrays.stream(order).mapToDouble(i -> stresses[i]).toArray());
	}

	/**
	 * The points of several curves as one, for instance of replicates.
	 *
	 * @throws IllegalArgumentException when there is no curve
	 */
	public static FlowCurve pooled(List<FlowCurve> curves) {
		return of(curves.stream().flatMapToDouble(c -> Arrays.stream(c.shearRates)).toArray(),
				curves.stream().flatMapToDouble(c -> Arrays.stream(c.stresses)).toArray());
	}

	private static boolean ascending(double[] values) {
		for (int i = 1; i < values.length; i++) {
			if (values[i] < values[i - 1]) {
				return false;
			}
		}
		return true;
	}

	private static void check(int index, String what, double value, String unit) {
		if (!(value > 0 && Double.isFinite(value))) {
			throw new IllegalArgumentException("point " + (index + 1) + ": " + what + " = " + value + " " + unit
					+ ": must be a finite number greater than 0");
		}
	}

	/** The number of points. */
	public int size() {
		return shearRates.length;
	}

	/** Shear rate of point {@code i} in 1/s; the points count from 0, the lowest rate first. */
	public double shearRate(int i) {
		return shearRates[i];
	}

	/** Shear stress of point {@code i} in Pa. */
	public double stress(int i) {
		return stresses[i];
	}

	/** All shear rates in 1/s, a copy. */
	public double[] shearRates() {
		return shearRates.clone();
	}

	/** All shear stresses in Pa, a copy, in the order of {@link #shearRates()}. */
	public double[] stresses() {
		return stresses.clone();
	}

	/** How many different shear rates there are. */
	public int differentShearRates() {
		int different = 1;
		for (int i = 1; i < shearRates.length; i++) {
			different += shearRates[i] == shearRates[i - 1] ? 0 : 1;
		}
		return different;
	}

	/** The span of the measured shear rates. */
	public MeasuredWindow window() {
		return new MeasuredWindow(shearRates[0], shearRates[shearRates.length - 1]);
	}
}
