package stirwright.rheology;

import java.util.List;

import stirwright.rheology.internal.Scale;
import stirwright.rheology.internal.Search;
import stirwright.rheology.internal.Shape;

/** A model fitted to a flow curve: its parameters with intervals, how well it fits, and what is doubtful about it. Immutable. */
public final class ModelFit {

	/** A root mean square deviation below this share of the measured values is no better than another: no instrument tells. */
	private static final double EQUALLY_GOOD = 1e-6;

	private static final double DESCRIBES = 0.10;

	private final ModelKind kind;
	private final FluidModel model;
	private final FlowCurve curve;
	private final FitOptions options;
	private final double rmsRelative;
	private final double aicc;
	private final double[] at;
	private final double[] factors;
	private final double[][] covariance;
	private final double level;
	private final double pull;
	private final List<Estimate> estimates;
	private final List<String> warnings;

	ModelFit(ModelKind kind, FluidModel model, FlowCurve curve, FitOptions options, Search.Place place, double[] factors,
			double[][] covariance, double level, double pull, List<Estimate> estimates) {
		this.kind = kind;
		this.model = model;
		this.curve = curve;
		this.options = options;
		this.rmsRelative = Math.sqrt(Objective.RELATIVE.residualSumOfSquares(model, curve) / curve.size());
		this.aicc = aicc(curve, options.objective(), place.sum(), estimates.size());
		this.at = place.at();
		this.factors = factors;
		this.covariance = covariance;
		this.level = level;
		this.pull = pull;
		this.estimates = List.copyOf(estimates);
		this.warnings = FitWarnings.of(this);
	}

	/** The kind of the model. */
	public ModelKind kind() {
		return kind;
	}

	/** The fitted model; a yield stress of exactly 0 means that its limit was reached. */
	public FluidModel model() {
		return model;
	}

	/** The points that it was fitted to. */
	public FlowCurve curve() {
		return curve;
	}

	/** How it was fitted. */
	public FitOptions options() {
		return options;
	}

	/** Number of measured points. */
	public int points() {
		return curve.size();
	}

	/** The parameters, in the order of {@link ModelKind#parameters()}. */
	public List<Estimate> estimates() {
		return estimates;
	}

	/** The estimate of the parameter of that name, as {@link Parameter#name()} has it. */
	public Estimate estimate(String parameter) {
		return estimates.stream().filter(e -> e.parameter().name().equals(parameter)).findFirst().orElseThrow();
	}

	/** What is doubtful, a sentence each; empty when nothing is. */
	public List<String> warnings() {
		return warnings;
	}

	/**
	 * Whether the points give every parameter: each has an interval with two ends, no viscosity, consistency or time is
	 * unknown by more than a factor of ten, and no flow index is held at its limit. Our choice; no source.
	 */
	public boolean determined() {
		return estimates.stream().allMatch(FitWarnings::given);
	}

	/**
	 * Whether nothing should hang on it: not all is given, the points are fewer than six or span less than a decade, or the
	 * model misses them by more than a tenth.
	 */
	public boolean doubtful() {
		return !determined() || FitWarnings.fewPoints(this) || !describes();
	}

	/** Whether the root mean square of the relative deviations is at most 0.1; our choice, no source. */
	public boolean describes() {
		return rmsRelative <= DESCRIBES;
	}

	/** What the objective sums, over points that count in full: Pa^2, Pa, or dimensionless. */
	public double residualSumOfSquares() {
		return options.objective().residualSumOfSquares(model, curve);
	}

	/** Root mean square of (fitted - measured) / measured, whatever the objective. */
	public double rmsRelative() {
		return rmsRelative;
	}

	/** ln(measured / fitted) at each point, in the order of the curve. */
	public double[] logResiduals() {
		double[] residuals = new double[curve.size()];
		for (int i = 0; i < residuals.length; i++) {
			residuals[i] = Math.log(curve.stress(i) / model.stress(curve.shearRate(i)));
		}
		return residuals;
	}

	/**
	 * Akaike's information criterion with the correction for few points, of normal deviations whose scatter is estimated too:
	 * N ln(S/N) + 2 k + 2 k (k + 1) / (N - k - 1), k being one more than the model has parameters. Only differences between
	 * models of the same points and objective mean anything. K. P. Burnham and D. R. Anderson, Model Selection and Multimodel
	 * Inference, 2nd ed. (2002), section 2.4; citation from memory.
	 *
	 * @return NaN with too few points
	 */
	public double aicc() {
		return aicc;
	}

	private static double aicc(FlowCurve curve, Objective objective, double sum, int parameters) {
		int n = curve.size();
		int k = parameters + 1;
		if (n - k - 1 <= 0) {
			return Double.NaN;
		}
		double measured = 0;
		for (int i = 0; i < n; i++) {
			double size = objective.slope(curve.stress(i), curve.stress(i)) * curve.stress(i);
			measured += size * size / n;
		}
		double meanSquare = Math.max(sum / n, EQUALLY_GOOD * EQUALLY_GOOD * measured);
		return n * Math.log(meanSquare) + 2.0 * k + 2.0 * k * (k + 1) / (n - k - 1);
	}

	/** How much each point counts in a robust fit, from 0 to 1, in the order of the curve; 1 everywhere in another. */
	public double[] weights() {
		double[] weights = new double[factors.length];
		for (int i = 0; i < weights.length; i++) {
			weights[i] = factors[i] * factors[i];
		}
		return weights;
	}

	/**
	 * The 95 % interval of the fitted stress in Pa at a shear rate, for the curve itself and not for a single measurement: by
	 * linearising, in the logarithm of the stress. Outside the measured rates it says nothing of whether the model holds.
	 *
	 * @param shearRate 1/s, finite and greater than 0
	 * @return {@link Interval#NONE} where the points do not give one
	 */
	public Interval band(double shearRate) {
		double stress = model.stress(shearRate);
		double[] gradient = new double[at.length];
		Shapes.of(kind).stress(shearRate, Math.log(shearRate), at, gradient);
		double variance = 0;
		for (int j = 0; j < gradient.length; j++) {
			for (int k = 0; k < gradient.length; k++) {
				variance += gradient[j] * covariance[j][k] * gradient[k];
			}
		}
		double relative = level * Math.sqrt(variance) / stress;
		return relative >= 0 && Double.isFinite(relative)
				? new Interval(stress * Math.exp(-relative), stress * pull * Math.exp(relative)) : Interval.NONE;
	}

	/**
	 * The covariance of two parameters, in the product of their units, by linearising; 0 for one that is held at its limit.
	 *
	 * @param i which one, in the order of {@link #estimates()}
	 * @param j the other
	 */
	public double covariance(int i, int j) {
		Shape shape = Shapes.of(kind);
		Scale[] scales = shape.scales();
		return scales[i].slope(at[i]) * covariance[i][j] * scales[j].slope(at[j]);
	}

	/** The correlation of two parameters, from -1 to 1; NaN for one that is held at its limit. */
	public double correlation(int i, int j) {
		return covariance[i][j] / Math.sqrt(covariance[i][i] * covariance[j][j]);
	}

	@Override
	public String toString() {
		return model + ", rms relative " + rmsRelative() + " over " + points() + " points";
	}
}
