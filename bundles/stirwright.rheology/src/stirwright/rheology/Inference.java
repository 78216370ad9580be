package stirwright.rheology;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

import stirwright.rheology.Estimate.Method;
import stirwright.rheology.internal.Huber;
import stirwright.rheology.internal.LeastIndex;
import stirwright.rheology.internal.LeastSquares;
import stirwright.rheology.internal.Points;
import stirwright.rheology.internal.Profile;
import stirwright.rheology.internal.Quantiles;
import stirwright.rheology.internal.Scale;
import stirwright.rheology.internal.Search;
import stirwright.rheology.internal.Shape;

/** What the points say of a model's parameters, given the place where its sum of squares is least. */
final class Inference {

	/** The root mean square deviation below which points count as met, as a share of what was measured. */
	private static final double MET = 1e-10;

	private static final int MOST_RESTARTS = 3;

	private static final int MANY = 500;

	/** Beyond a scatter of a third deviations are no noise, and the second order of anything says nothing. */
	private static final double MOST_PULL = 0.25;

	/** Of the logarithm of a factor: e^7 is about a thousand. */
	private static final double HOPELESS = 7;

	private final ModelKind kind;
	private final Shape shape;
	private final Scale[] scales;
	private final Points points;
	private final FitOptions options;
	private final Search search;
	private final Search.Place place;
	private final int degreesOfFreedom;
	private final double meanSquare;
	private final double[][] free;
	private final double[][] all;
	private final double single;
	private final double joint;

	private Inference(ModelKind kind, Points points, FitOptions options, Search search, Search.Place place,
			Quantiles quantiles) {
		this.kind = kind;
		this.shape = Shapes.of(kind);
		this.scales = shape.scales();
		this.points = points;
		this.options = options;
		this.search = search;
		this.place = place;
		// A factor at the end of the world is no limit of the model, but one that the points do not give.
		int[] loose = IntStream.range(0, scales.length).filter(j -> !place.held()[j] || scales[j] == Scale.LOG).toArray();
		// With no more points than parameters one at its limit frees no point for a judgement.
		this.degreesOfFreedom = points.size() > scales.length ? points.size() - loose.length : 0;
		LeastSquares.Minimum here = search.evaluate(place.at());
		this.meanSquare = meanSquare(here);
		this.all = scaled(LeastSquares.inverseNormal(unweighted(here.jacobian())), IntStream.range(0, scales.length).toArray());
		this.free = loose.length == scales.length ? all
				: scaled(LeastSquares.inverseNormal(columns(unweighted(here.jacobian()), loose)), loose);
		this.single = degreesOfFreedom > 0 ? quantiles.single(degreesOfFreedom) : Double.NaN;
		this.joint = degreesOfFreedom > 0 ? quantiles.joint(loose.length, degreesOfFreedom) : Double.NaN;
	}

	static ModelFit of(ModelKind kind, FlowCurve curve, FitOptions options, Points points, Search search,
			Search.Place best, Quantiles quantiles) {
		Search.Place place = best;
		for (int i = 0;; i++) {
			Inference inference = new Inference(kind, points, options, search, place, quantiles);
			Profile profile = new Profile(search, place, inference.all, inference.meanSquare);
			List<Estimate> estimates = inference.estimates(profile);
			if (profile.lowerPlace() == null || i == MOST_RESTARTS) {
				return new ModelFit(kind, inference.model(), curve, options, place, points.factors(), inference.free,
						inference.single, inference.pull(), estimates);
			}
			place = search.from(profile.lowerPlace().at(), -1);
		}
	}

	private double meanSquare(LeastSquares.Minimum here) {
		double measured = 0;
		for (int i = 0; i < points.size(); i++) {
			double size = points.weights()[i] * points.stresses()[i];
			measured += size * size;
		}
		int degrees = Math.max(1, degreesOfFreedom);
		double mean = options.robust() ? Huber.meanSquare(here.deviations(), points.factors(), degrees) : here.sum() / degrees;
		return Math.max(mean, MET * MET * measured / points.size());
	}

	/** The robust estimate's covariance takes every point in full; see {@link Huber#meanSquare}. */
	private double[][] unweighted(double[][] jacobian) {
		if (!options.robust()) {
			return jacobian;
		}
		double[][] whole = new double[jacobian.length][scales.length];
		for (int i = 0; i < whole.length; i++) {
			for (int j = 0; j < scales.length; j++) {
				whole[i][j] = jacobian[i][j] / points.factors()[i];
			}
		}
		return whole;
	}

	private static double[][] columns(double[][] jacobian, int[] chosen) {
		double[][] part = new double[jacobian.length][chosen.length];
		for (int i = 0; i < part.length; i++) {
			for (int k = 0; k < chosen.length; k++) {
				part[i][k] = jacobian[i][chosen[k]];
			}
		}
		return part;
	}

	/** Times the mean square, with rows and columns of 0 for coordinates that are not in it. */
	private double[][] scaled(double[][] inverse, int[] coordinates) {
		double[][] whole = new double[scales.length][scales.length];
		for (int j = 0; j < coordinates.length; j++) {
			for (int k = 0; k < coordinates.length; k++) {
				whole[coordinates[j]][coordinates[k]] = meanSquare * inverse[j][k];
			}
		}
		return whole;
	}

	private FluidModel model() {
		return kind.create(IntStream.range(0, scales.length).mapToDouble(j -> scales[j].parameter(place.at()[j])).toArray());
	}

	private List<Estimate> estimates(Profile profile) {
		List<Estimate> estimates = new ArrayList<>();
		boolean straight = shape.linear() && options.objective().linear() && IntStream.range(0, scales.length)
				.noneMatch(j -> place.held()[j]);
		boolean byProfile = !options.robust() && !straight && worthAProfile();
		for (int j = 0; j < scales.length; j++) {
			double at = place.at()[j];
			boolean held = place.held()[j] && scales[j] != Scale.LOG;
			double error = held || degreesOfFreedom == 0 ? Double.NaN : Math.sqrt(free[j][j]);
			double reach = held && degreesOfFreedom > 0 ? Math.sqrt(all[j][j]) : error;
			Interval jointly = widened(j, linear(j, joint * error));
			Interval alone = widened(j, byProfile ? profiled(profile, j) : linear(j, single * reach));
			Method method = Double.isNaN(alone.low()) && Double.isNaN(alone.high()) ? Method.NONE
					: byProfile ? Method.PROFILE : Method.LINEAR;
			estimates.add(new Estimate(kind.parameters().get(j), scales[j].parameter(at), scales[j].slope(at) * error,
					alone, jointly, method, held));
		}
		return estimates;
	}

	/**
	 * A profile along which nothing changes is a long walk to nowhere: not where a factor is unknown by a thousand. And of
	 * many points a profile is straight.
	 */
	private boolean worthAProfile() {
		boolean worth = degreesOfFreedom > 0 && points.size() <= MANY;
		for (int j = 0; j < scales.length; j++) {
			worth &= scales[j] != Scale.LOG || single * Math.sqrt(free[j][j]) < HOPELESS;
		}
		return worth;
	}

	/**
	 * Deviations relative to the measured stress pull the fitted one down by twice their mean square: with y = f (1 + e) the
	 * least sum of (g/y - 1)^2 has g = f (1 - 2 E e^2) to second order. All that is proportional to a stress shares that factor,
	 * so that its upper end is moved by it; the lower one stays, since the estimate is not moved.
	 */
	private Interval widened(int j, Interval interval) {
		boolean ofStress = !kind.parameters().get(j).equals(ModelParameters.FLOW_INDEX)
				&& !kind.parameters().get(j).equals(ModelParameters.TIME_CONSTANT);
		return ofStress ? new Interval(interval.low(), interval.high() * pull()) : interval;
	}

	private double pull() {
		return options.objective() == Objective.RELATIVE ? 1 + Math.min(2 * meanSquare, MOST_PULL) : 1;
	}

	private Interval linear(int j, double distance) {
		if (Double.isNaN(distance)) {
			return Interval.NONE;
		}
		double at = place.at()[j];
		return limited(j, new Interval(end(j, Math.max(at - distance, shape.lower(j))), end(j, Math.min(at + distance, shape.upper(j)))));
	}

	private Interval profiled(Profile profile, int j) {
		double low = profile.end(j, -1, single);
		double high = profile.lowerPlace() == null ? profile.end(j, 1, single) : Double.NaN;
		return limited(j, new Interval(end(j, low), end(j, high)));
	}

	/** A flow index is between 0 and 2; one that may be anything is not given. */
	private Interval limited(int j, Interval interval) {
		if (!kind.parameters().get(j).equals(ModelParameters.FLOW_INDEX)) {
			return interval;
		}
		return interval.low() < 0 && interval.high() > Checks.MAX_FLOW_INDEX ? Interval.NONE
				: new Interval(Math.max(interval.low(), 0), Math.min(interval.high(), Checks.MAX_FLOW_INDEX));
	}

	/** A coordinate's parameter; NaN where the interval does not end. */
	private double end(int j, double coordinate) {
		boolean bound = coordinate <= shape.lower(j) || coordinate >= shape.upper(j);
		double parameter = coordinate == LeastIndex.VALUE ? 0 : scales[j].parameter(coordinate);
		boolean nowhere = scales[j] == Scale.LOG && (bound || Math.abs(coordinate - place.at()[j]) > HOPELESS);
		return nowhere || Double.isInfinite(parameter) ? Double.NaN : parameter;
	}
}
