package stirwright.rheology.internal;

import java.util.stream.IntStream;

/**
 * Bounded least squares of one model's stress against measured points. A coordinate that wants out of its bounds is held
 * there, and let go again when the sum falls inwards.
 */
public final class Search {

	/** More points than this are thinned for the scan and the first descent; the last descent is along all of them. */
	private static final int MANY = 300;

	/** By how much the sum would have to fall, relative. */
	private static final double WORTH = 1e-4;

	private final Shape shape;
	private final Scale[] scales;
	private final Points points;
	private final Measure measure;
	private final int size;

	/**
	 * Where the sum is least.
	 *
	 * @param at   coordinates
	 * @param held which of them are held at a bound
	 * @param sum  of the squared deviations
	 */
	public record Place(double[] at, boolean[] held, double sum) {
	}

	/** Nothing is searched yet. */
	public Search(Shape shape, Points points, Measure measure) {
		this.shape = shape;
		this.points = points;
		this.measure = measure;
		this.scales = shape.scales();
		this.size = scales.length;
	}

	/** From every start of the shape; null where it has none. */
	public Place best() {
		if (points.size() > MANY) {
			return bestOfMany();
		}
		Place best = null;
		for (double[] start : shape.starts(points)) {
			Place here = from(start, -1);
			best = best == null || here.sum() < best.sum() ? here : best;
		}
		return best == null ? null : toTheLastDigit(best, -1);
	}

	/** From where some of the points lead; a bound is looked at anew by all of them. */
	private Place bestOfMany() {
		Place some = new Search(shape, points.thinned(MANY), measure).best();
		if (some == null) {
			return null;
		}
		Place rough = new Place(some.at(), some.held(), evaluate(some.at()).sum());
		Place close = toTheLastDigit(rough, -1);
		// A first coordinate that may be 0 is a yield stress or the like; the models with two plateaus have none, and are slow.
		boolean again = scales[0] != Scale.LOG && (rough.held()[0] || close == rough);
		return again ? toTheLastDigit(from(rough.at(), -1), -1) : close;
	}

	/** From a start within the bounds with one coordinate fixed, to the last digit. */
	public Place best(double[] start, int fixed) {
		return toTheLastDigit(from(start, fixed), fixed);
	}

	/**
	 * From a start within the bounds, with one coordinate fixed, or -1 for none, to a millionth of the sum or so. What starts at
	 * a bound is held there at first.
	 */
	public Place from(double[] start, int fixed) {
		double[] at = start.clone();
		boolean[] held = new boolean[size];
		for (int j = 0; j < size; j++) {
			held[j] = j != fixed && (at[j] == shape.lower(j) || at[j] == shape.upper(j));
		}
		boolean[] released = new boolean[size];
		Place best = null;
		for (int round = 0; round < 2 * size + 1; round++) {
			LeastSquares.Minimum next = LeastSquares.roughly(free(at, held, fixed), pick(at, held, fixed));
			double[] there = spread(next.at(), at, held, fixed);
			if (best == null && !inside(there, held, fixed)) {
				// What is clamped may end above the start, which a descent within the bounds never does.
				best = new Place(at.clone(), held.clone(), evaluate(at).sum());
			}
			if (clamp(there, at, held, fixed)) {
				continue;
			}
			at = there;
			if (best == null || next.sum() < best.sum()) {
				best = new Place(at.clone(), held.clone(), next.sum());
			}
			if (!release(at, held, released)) {
				break;
			}
		}
		return best;
	}

	private Place toTheLastDigit(Place place, int fixed) {
		LeastSquares.Deviations free = free(place.at(), place.held(), fixed);
		double[] start = pick(place.at(), place.held(), fixed);
		// Against the errors of the points, which many of them shrink a hundredfold or so, more digits would say nothing.
		double[] last = (points.size() > MANY ? LeastSquares.closely(free, start) : LeastSquares.toTheLastDigit(free, start)).at();
		double[] at = spread(last, place.at(), place.held(), fixed);
		return IntStream.range(0, size).allMatch(j -> inside(j, at[j]))
				? new Place(at, place.held(), evaluate(at).sum()) : place;
	}

	/** Moves what left its bounds back onto them, in the place that was started from; whether there was any. */
	private boolean clamp(double[] there, double[] at, boolean[] held, int fixed) {
		boolean any = false;
		for (int j = 0; j < size; j++) {
			if (j != fixed && !inside(j, there[j])) {
				at[j] = there[j] < shape.lower(j) ? shape.lower(j) : shape.upper(j);
				held[j] = true;
				any = true;
			}
		}
		return any;
	}

	private boolean inside(double[] at, boolean[] held, int fixed) {
		return IntStream.range(0, size).allMatch(j -> j == fixed || held[j] || inside(j, at[j]));
	}

	private boolean inside(int j, double coordinate) {
		return coordinate >= shape.lower(j) && coordinate <= shape.upper(j);
	}

	/** Lets each held coordinate go once if the sum falls inwards; whether there was any. */
	private boolean release(double[] at, boolean[] held, boolean[] released) {
		if (IntStream.range(0, size).noneMatch(j -> held[j] && !released[j])) {
			return false;
		}
		LeastSquares.Minimum here = evaluate(at);
		boolean any = false;
		for (int j = 0; j < size; j++) {
			if (held[j] && !released[j]) {
				double downhill = 0;
				double square = 0;
				for (int i = 0; i < here.deviations().length; i++) {
					downhill -= here.deviations()[i] * here.jacobian()[i][j];
					square += here.jacobian()[i][j] * here.jacobian()[i][j];
				}
				boolean inwards = at[j] == shape.lower(j) ? downhill > 0 : downhill < 0;
				// A factor at the end of the world hardly matters there, and noise alone would send the search for its valley.
				boolean worth = scales[j] != Scale.LOG || downhill * downhill > WORTH * square * here.sum();
				if (inwards && worth) {
					held[j] = false;
					released[j] = true;
					any = true;
				}
			}
		}
		return any;
	}

	/** Deviations and their derivatives with respect to every coordinate, held ones included. */
	public LeastSquares.Minimum evaluate(double[] at) {
		double[] deviations = new double[points.size()];
		double[][] jacobian = new double[deviations.length][size];
		boolean[] none = new boolean[size];
		free(at, none, -1).evaluate(at, deviations, jacobian);
		double sum = 0;
		for (double deviation : deviations) {
			sum += deviation * deviation;
		}
		return new LeastSquares.Minimum(at, sum, jacobian, deviations);
	}

	private LeastSquares.Deviations free(double[] at, boolean[] held, int fixed) {
		int[] columns = IntStream.range(0, size).filter(j -> !held[j] && j != fixed).toArray();
		double[] whole = at.clone();
		double[] gradient = new double[size];
		double[] measured = points.stresses();
		return new LeastSquares.Deviations() {
			@Override
			public int size() {
				return measured.length;
			}

			@Override
			public void evaluate(double[] free, double[] deviations, double[][] jacobian) {
				for (int k = 0; k < columns.length; k++) {
					whole[columns[k]] = free[k];
				}
				for (int i = 0; i < measured.length; i++) {
					double stress = shape.stress(points.rates()[i], points.logRates()[i], whole, gradient);
					deviations[i] = points.factors()[i] * measure.deviation(stress, measured[i]);
					double slope = points.factors()[i] * measure.slope(stress, measured[i]);
					for (int k = 0; k < columns.length; k++) {
						jacobian[i][k] = slope * gradient[columns[k]];
					}
				}
			}
		};
	}

	private double[] pick(double[] at, boolean[] held, int fixed) {
		return IntStream.range(0, size).filter(j -> !held[j] && j != fixed).mapToDouble(j -> at[j]).toArray();
	}

	private double[] spread(double[] free, double[] at, boolean[] held, int fixed) {
		double[] whole = at.clone();
		int k = 0;
		for (int j = 0; j < size; j++) {
			if (!held[j] && j != fixed) {
				whole[j] = free[k++];
			}
		}
		return whole;
	}

	/** The least value of a coordinate. */
	double lower(int j) {
		return shape.lower(j);
	}

	/** The greatest value of a coordinate. */
	double upper(int j) {
		return shape.upper(j);
	}
}
