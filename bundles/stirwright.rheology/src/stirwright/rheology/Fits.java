package stirwright.rheology;

import java.util.Arrays;

import stirwright.rheology.internal.Huber;
import stirwright.rheology.internal.Points;
import stirwright.rheology.internal.Quantiles;
import stirwright.rheology.internal.Scale;
import stirwright.rheology.internal.Search;

/**
 * Least-squares fits of fluid models to a measured flow curve.
 *
 * <p>A yield stress and a plateau at high rates are held at 0 or above, and a model with a plateau keeps its flow index
 * above 0. The other parameters are free: where the best ones lie outside the model's limits, for example a flow index
 * below 0 for stresses that fall as the shear rate rises, the model does not describe the curve, and a parameter moved to
 * its limit would hide that.
 */
public final class Fits {

	private Fits() {
	}

	/**
	 * Fits one model. Its sum of squares never exceeds that of a model that it contains: Herschel and Bulkley's and Sisko's
	 * never that of the power law.
	 *
	 * @throws IllegalArgumentException if the curve has fewer different shear rates than the model has parameters, or does
	 *                                  not thin and the model knows nothing else
	 * @throws ParameterException       if the best parameters are out of the model's limits
	 */
	public static ModelFit one(ModelKind kind, FlowCurve curve, FitOptions options) {
		requireDifferentRates(kind, curve);
		Points points = points(curve, options.objective());
		return one(kind, curve, options, options.robust() ? points.with(robust(kind, points, options).factors()) : points,
				new Quantiles());
	}

	static ModelFit one(ModelKind kind, FlowCurve curve, FitOptions options, Points points, Quantiles quantiles) {
		requireDifferentRates(kind, curve);
		Search search = search(kind, points, options);
		Search.Place best = search.best();
		if (kind == ModelKind.HERSCHEL_BULKLEY || kind == ModelKind.SISKO) {
			best = notWorse(search, best, search(ModelKind.POWER_LAW, points, options).best());
		}
		if (best == null) {
			throw new IllegalArgumentException("does not describe this curve, whose viscosity does not fall as the shear rate rises");
		}
		return Inference.of(kind, curve, options, points, search, best, quantiles);
	}

	/**
	 * The best values of the other parameters when one is held.
	 *
	 * @param values to start from, in the parameters' order and units
	 * @param held   which one
	 * @param at     its value
	 */
	static double[] with(ModelKind kind, FlowCurve curve, FitOptions options, double[] values, int held, double at) {
		Scale[] scales = Shapes.of(kind).scales();
		double[] start = new double[values.length];
		Arrays.setAll(start, j -> scales[j].coordinate(j == held ? at : values[j]));
		Points points = points(curve, options.objective());
		double[] best = search(kind, options.robust() ? points.with(robust(kind, points, options).factors()) : points, options)
				.best(start, held).at();
		Arrays.setAll(best, j -> scales[j].parameter(best[j]));
		return best;
	}

	/** The power law is what both models become when their first parameter is 0; what only rounding tells from it is it. */
	private static Search.Place notWorse(Search search, Search.Place best, Search.Place powerLaw) {
		double[] at = { 0, powerLaw.at()[0], powerLaw.at()[1] };
		double sum = search.evaluate(at).sum();
		return best != null && best.sum() < sum * (1 - 1e-12) ? best : new Search.Place(at, new boolean[] { true, false, false }, sum);
	}

	static Huber robust(ModelKind kind, Points points, FitOptions options) {
		return Huber.of(Shapes.of(kind), points, Shapes.measure(options.objective()));
	}

	static Points points(FlowCurve curve, Objective objective) {
		double[] stresses = curve.stresses();
		return Points.of(curve.shearRates(), stresses, Arrays.stream(stresses).map(y -> objective.slope(y, y)).toArray());
	}

	private static Search search(ModelKind kind, Points points, FitOptions options) {
		return new Search(Shapes.of(kind), points, Shapes.measure(options.objective()));
	}

	static void requireDifferentRates(ModelKind kind, FlowCurve curve) {
		int needed = kind.parameters().size();
		int found = curve.differentShearRates();
		if (found < needed) {
			throw new IllegalArgumentException(
					"the fit needs at least " + needed + " different shear rates, the curve has " + found);
		}
	}
}
