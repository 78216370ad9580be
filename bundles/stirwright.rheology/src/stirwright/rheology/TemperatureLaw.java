package stirwright.rheology;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

import org.apache.commons.math3.distribution.TDistribution;
import org.apache.commons.math3.stat.regression.SimpleRegression;

/**
 * One model over several temperatures: one flow index for all, and every other parameter p by the law of Arrhenius, ln p = a +
 * E/(R T), fitted by a straight line over 1/T. Common for food products, for instance J. F. Steffe, Rheological Methods in Food
 * Process Engineering, 2nd ed. (1996), section 2.6; citation from memory, section not checked.
 *
 * <p>Between the measured temperatures it interpolates; outside them it says nothing of melting, setting or drying.
 */
public final class TemperatureLaw {

	/** J/(mol K), exact by the definition of the units of 2019. */
	private static final double GAS_CONSTANT = 8.31446261815324;

	/** 0 deg C in K, by definition. */
	private static final double FREEZING = 273.15;

	private final ModelKind kind;
	private final double lowest;
	private final double highest;
	private final List<Line> lines;
	private final double rmsRelative;
	private final double worst;

	/**
	 * A measured curve.
	 *
	 * @param celsius deg C
	 * @param curve   its points
	 */
	public record Measured(double celsius, FlowCurve curve) {
	}

	/**
	 * How one parameter depends on the temperature.
	 *
	 * @param parameter        which one
	 * @param activationEnergy E in J/mol; 0 for a flow index
	 * @param interval         of E, 95 %; NONE with two temperatures
	 * @param intercept        a, for the parameter in its unit; the value itself for a flow index
	 */
	public record Line(Parameter parameter, double activationEnergy, Interval interval, double intercept) {

		private double at(double kelvin) {
			return activationEnergy == 0 && parameter.equals(ModelParameters.FLOW_INDEX) ? intercept
					: Math.exp(intercept + activationEnergy / (GAS_CONSTANT * kelvin));
		}
	}

	private TemperatureLaw(ModelKind kind, TreeMap<Double, FlowCurve> curves, List<Line> lines) {
		this.kind = kind;
		this.lowest = curves.firstKey();
		this.highest = curves.lastKey();
		this.lines = List.copyOf(lines);
		double sum = 0;
		double most = 0;
		int points = 0;
		for (Map.Entry<Double, FlowCurve> one : curves.entrySet()) {
			FluidModel model = at(one.getKey());
			for (int i = 0; i < one.getValue().size(); i++) {
				double miss = model.stress(one.getValue().shearRate(i)) / one.getValue().stress(i) - 1;
				sum += miss * miss;
				most = Math.max(most, Math.abs(miss));
				points++;
			}
		}
		this.rmsRelative = Math.sqrt(sum / points);
		this.worst = most;
	}

	/**
	 * Fits the law. Curves of the same temperature are pooled.
	 *
	 * @return empty with fewer than two temperatures, or where a parameter is 0 at one of them and has no logarithm
	 * @throws IllegalArgumentException when a curve has too few different shear rates
	 * @throws ParameterException       when the model does not describe a curve
	 */
	public static Optional<TemperatureLaw> of(ModelKind kind, List<Measured> measured, FitOptions options) {
		TreeMap<Double, FlowCurve> curves = new TreeMap<>();
		measured.forEach(m -> curves.merge(m.celsius(), m.curve(), (one, other) -> FlowCurve.pooled(List.of(one, other))));
		if (curves.size() < 2) {
			return Optional.empty();
		}
		int index = kind.parameters().indexOf(ModelParameters.FLOW_INDEX);
		List<double[]> values = new ArrayList<>();
		for (FlowCurve curve : curves.values()) {
			values.add(ModelKind.values(Fits.one(kind, curve, options).model()));
		}
		if (index >= 0) {
			double common = values.stream().mapToDouble(v -> v[index]).average().getAsDouble();
			int i = 0;
			for (FlowCurve curve : curves.values()) {
				values.set(i, Fits.with(kind, curve, options, values.get(i), index, common));
				i++;
			}
		}
		double[] inverse = curves.keySet().stream().mapToDouble(c -> 1 / (GAS_CONSTANT * (c + FREEZING))).toArray();
		List<Line> lines = new ArrayList<>();
		for (int j = 0; j < kind.parameters().size(); j++) {
			int place = j;
			double[] ofParameter = values.stream().mapToDouble(v -> v[place]).toArray();
			if (Arrays.stream(ofParameter).anyMatch(v -> v <= 0)) {
				return Optional.empty();
			}
			lines.add(j == index ? new Line(kind.parameters().get(j), 0, Interval.NONE, ofParameter[0])
					: line(kind.parameters().get(j), inverse, ofParameter));
		}
		return Optional.of(new TemperatureLaw(kind, curves, lines));
	}

	private static Line line(Parameter parameter, double[] inverse, double[] values) {
		SimpleRegression line = new SimpleRegression();
		for (int i = 0; i < values.length; i++) {
			line.addData(inverse[i], Math.log(values[i]));
		}
		double energy = line.getSlope();
		Interval interval = Interval.NONE;
		if (values.length > 2) {
			double half = new TDistribution(null, values.length - 2).inverseCumulativeProbability(0.975) * line.getSlopeStdErr();
			interval = new Interval(energy - half, energy + half);
		}
		return new Line(parameter, energy, interval, line.getIntercept());
	}

	/** The kind of model. */
	public ModelKind kind() {
		return kind;
	}

	/** The lowest measured temperature in deg C. */
	public double lowest() {
		return lowest;
	}

	/** The highest measured temperature in deg C. */
	public double highest() {
		return highest;
	}

	/** A line for each parameter, in the order of the model's parameters. */
	public List<Line> lines() {
		return lines;
	}

	/** Root mean square of (law - measured) / measured over the stresses of all temperatures. */
	public double rmsRelative() {
		return rmsRelative;
	}

	/** The largest of these deviations. */
	public double worst() {
		return worst;
	}

	/** How many K a temperature in deg C lies outside the measured ones; 0 within. */
	public double outside(double celsius) {
		return Math.max(0, Math.max(lowest - celsius, celsius - highest));
	}

	/**
	 * The model at a temperature in deg C, above absolute zero; ask {@link #outside} whether it is extrapolated.
	 *
	 * @throws ParameterException if a parameter is beyond its limits there
	 */
	public FluidModel at(double celsius) {
		return kind.create(lines.stream().mapToDouble(line -> line.at(celsius + FREEZING)).toArray());
	}
}
