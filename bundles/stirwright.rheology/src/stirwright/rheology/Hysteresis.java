package stirwright.rheology;

import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * How a curve measured with rising shear rates differs from one with falling rates. Between measured points the stress is
 * taken along a straight line in logarithms; nothing is extrapolated.
 */
public final class Hysteresis {

	private final TreeMap<Double, Double> up;
	private final TreeMap<Double, Double> down;
	private final MeasuredWindow common;

	private Hysteresis(TreeMap<Double, Double> up, TreeMap<Double, Double> down, MeasuredWindow common) {
		this.up = up;
		this.down = down;
		this.common = common;
	}

	/** Empty when the two curves have no shear rates in common. */
	public static Optional<Hysteresis> between(FlowCurve up, FlowCurve down) {
		double from = Math.max(up.window().min(), down.window().min());
		double to = Math.min(up.window().max(), down.window().max());
		return from < to ? Optional.of(new Hysteresis(logarithms(up), logarithms(down), new MeasuredWindow(from, to)))
				: Optional.empty();
	}

	/** Mean logarithm of the stress over logarithm of the rate. */
	private static TreeMap<Double, Double> logarithms(FlowCurve curve) {
		TreeMap<Double, double[]> sums = new TreeMap<>();
		for (int i = 0; i < curve.size(); i++) {
			double[] sum = sums.computeIfAbsent(Math.log(curve.shearRate(i)), r -> new double[2]);
			sum[0] += Math.log(curve.stress(i));
			sum[1]++;
		}
		TreeMap<Double, Double> means = new TreeMap<>();
		sums.forEach((rate, sum) -> means.put(rate, sum[0] / sum[1]));
		return means;
	}

	/** The shear rates that both curves cover. */
	public MeasuredWindow common() {
		return common;
	}

	/**
	 * The stress of the rising over that of the falling curve; above 1 for a product that breaks down as it is sheared.
	 *
	 * @param shearRate 1/s
	 * @return NaN outside the common rates
	 */
	public double ratioAt(double shearRate) {
		return common.contains(shearRate) ? Math.exp(at(up, Math.log(shearRate)) - at(down, Math.log(shearRate))) : Double.NaN;
	}

	/** The area between the curves over the common rates in Pa/s, positive where the rising one lies higher. */
	public double area() {
		return integral(up) - integral(down);
	}

	/** The area between the curves over that below the rising one. */
	public double relativeArea() {
		return area() / integral(up);
	}

	/** Trapezoids over the points of both curves, at straight scales, as loop areas are commonly taken. */
	private double integral(TreeMap<Double, Double> curve) {
		double from = Math.log(common.min());
		double to = Math.log(common.max());
		TreeSet<Double> places = new TreeSet<>(up.subMap(from, true, to, true).keySet());
		places.addAll(down.subMap(from, true, to, true).keySet());
		double sum = 0;
		double lastRate = Double.NaN;
		double lastStress = Double.NaN;
		for (double place : places) {
			double rate = Math.exp(place);
			double stress = Math.exp(at(curve, place));
			if (!Double.isNaN(lastRate)) {
				sum += (rate - lastRate) * (stress + lastStress) / 2;
			}
			lastRate = rate;
			lastStress = stress;
		}
		return sum;
	}

	private static double at(TreeMap<Double, Double> curve, double logRate) {
		Map.Entry<Double, Double> below = curve.floorEntry(logRate);
		Map.Entry<Double, Double> above = curve.ceilingEntry(logRate);
		// An end of the common rates may miss its own point by rounding.
		if (below == null || above == null) {
			return (below == null ? above : below).getValue();
		}
		double span = above.getKey() - below.getKey();
		double share = span == 0 ? 0 : (logRate - below.getKey()) / span;
		return below.getValue() + share * (above.getValue() - below.getValue());
	}
}
