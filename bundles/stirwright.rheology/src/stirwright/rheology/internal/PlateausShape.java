package stirwright.rheology.internal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Models with a plateau of the viscosity at each end: viscosity = infinite + (zero - infinite) * thinning(time constant *
 * rate, n). Coordinates: logarithm of zero, infinite, logarithm of the time constant, n.
 */
public abstract class PlateausShape implements Shape {

	private static final int ZERO = 0;
	private static final int INFINITE = 1;
	static final int TIME = 2;
	static final int INDEX = 3;

	/** Of the logarithm of the time constant in s: beyond it nobody sees a plateau. */
	private static final double FARTHEST = 30;

	private static final double[] INDICES = { 0.001, 0.15, 0.3, 0.45, 0.6, 0.75, 0.9 };

	/** Natural logarithms: how far below the lowest rate, and above the highest, a bend is looked for; and in what steps. */
	private static final double BELOW = 12;
	private static final double ABOVE = 4;
	private static final double STEP = 1.5;

	private static final int VALLEYS = 2;

	/** A valley of so many times the lowest sum in the scan does not become the lowest. */
	private static final double HOPELESS = 4;

	private record Place(double time, double n, TwoTerms terms) {
	}

	@Override
	public final Scale[] scales() {
		return new Scale[] { Scale.LOG, Scale.PLAIN, Scale.LOG, Scale.PLAIN };
	}

	@Override
	public final double lower(int coordinate) {
		return switch (coordinate) {
			case INFINITE -> 0;
			case TIME -> -FARTHEST;
			case INDEX -> LeastIndex.VALUE;
			default -> Double.NEGATIVE_INFINITY;
		};
	}

	@Override
	public final double upper(int coordinate) {
		return switch (coordinate) {
			case TIME -> FARTHEST;
			case INDEX -> 1;
			default -> Double.POSITIVE_INFINITY;
		};
	}

	/** What of the thinning depends on time constant * rate alone; of its natural logarithm. */
	abstract double bend(double log);

	/** What is left of the difference of the plateaus, from 1 to 0. */
	abstract double left(double bend, double n);

	/**
	 * The derivatives of {@link #left}.
	 *
	 * @param log      natural logarithm of time constant * rate
	 * @param bend     its {@link #bend}
	 * @param left     its {@link #left}
	 * @param gradient its elements {@code TIME} and {@code INDEX} are set: with respect to {@code log} and to {@code n}
	 */
	abstract void derive(double log, double bend, double left, double n, double[] gradient);

	@Override
	public final double stress(double rate, double logRate, double[] at, double[] gradient) {
		double zero = Math.exp(at[ZERO]);
		double log = at[TIME] + logRate;
		double bend = bend(log);
		double left = left(bend, at[INDEX]);
		derive(log, bend, left, at[INDEX], gradient);
		double range = rate * (zero - at[INFINITE]);
		gradient[ZERO] = rate * zero * left;
		gradient[INFINITE] = rate * (1 - left);
		gradient[TIME] *= range;
		gradient[INDEX] *= range;
		return rate * at[INFINITE] + range * left;
	}

	@Override
	public final List<double[]> starts(Points points) {
		List<Place> lowest = new ArrayList<>();
		double from = -points.logRates()[points.size() - 1] - ABOVE;
		double to = -points.logRates()[0] + BELOW;
		double[] bends = new double[points.size()];
		double[] thinned = new double[points.size()];
		for (double time = from; time <= to; time += STEP) {
			for (int i = 0; i < bends.length; i++) {
				bends[i] = bend(time + points.logRates()[i]);
			}
			Place best = null;
			for (double n : INDICES) {
				for (int i = 0; i < thinned.length; i++) {
					thinned[i] = points.rates()[i] * left(bends[i], n);
				}
				TwoTerms terms = TwoTerms.of(points, points.rates(), thinned);
				if (terms.second() > 0 && (best == null || terms.residual() < best.terms().residual())) {
					best = new Place(time, n, terms);
				}
			}
			if (best != null) {
				lowest.add(best);
			}
		}
		lowest.sort(Comparator.comparingDouble(p -> p.terms().residual()));
		List<Place> chosen = new ArrayList<>();
		for (Place place : lowest) {
			boolean hopeful = place.terms().residual() < HOPELESS * lowest.get(0).terms().residual() || place == lowest.get(0);
			if (hopeful && chosen.size() < VALLEYS && chosen.stream().noneMatch(c -> near(c, place))) {
				chosen.add(place);
			}
		}
		return chosen.stream().map(place -> start(place, place.time() > to - 2 * STEP)).toList();
	}

	/**
	 * Where the points want the bend as far below them as it can be, they are a power law there, and the valley is one without a
	 * bottom: it starts at its far end, with the same power law.
	 */
	private static double[] start(Place place, boolean withoutBottom) {
		double range = Math.log(place.terms().second());
		double time = place.time();
		if (withoutBottom) {
			range += (1 - place.n()) * (FARTHEST - time);
			time = FARTHEST;
		}
		return new double[] { Math.log(place.terms().first() + Math.exp(range)), place.terms().first(), time, place.n() };
	}

	private static boolean near(Place one, Place other) {
		return Math.abs(one.time() - other.time()) <= 2 * STEP;
	}
}
