package stirwright.rheology.internal;

import java.util.Arrays;

/**
 * Huber's estimate by reweighted least squares: a point farther off than {@code BEND} times the usual scatter counts less,
 * the less the farther. P. J. Huber, Robust Statistics (1981), chapter 7; citation from memory.
 *
 * @param factors what each point's deviation is multiplied by
 * @param scatter of the deviations, by their median
 */
public record Huber(double[] factors, double scatter) {

	/** 95 % efficiency for normal errors; from memory. */
	private static final double BEND = 1.345;

	/** The median of the absolute value of a standard normal variable. */
	private static final double NORMAL_MEDIAN = 0.6744897501960817;

	private static final int MOST_ROUNDS = 30;
	private static final double SETTLED = 1e-4;
	private static final int ENOUGH = 1000;

	/** Null where the shape has no start. Of very many points some settle where the model lies, and all are weighed by it. */
	public static Huber of(Shape shape, Points points, Measure measure) {
		Points few = points.thinned(ENOUGH);
		Search.Place place = settled(shape, few, measure);
		if (place == null) {
			return null;
		}
		double[] deviations = new Search(shape, points, measure).evaluate(place.at()).deviations();
		double scatter = scatter(deviations);
		return new Huber(factors(deviations, scatter), scatter);
	}

	private static Search.Place settled(Shape shape, Points points, Measure measure) {
		double[] factors = points.factors();
		Search.Place place = new Search(shape, points, measure).best();
		if (place == null) {
			return null;
		}
		Search plain = new Search(shape, points, measure);
		for (int round = 0; round < MOST_ROUNDS; round++) {
			double[] deviations = plain.evaluate(place.at()).deviations();
			double[] next = factors(deviations, scatter(deviations));
			double change = 0;
			for (int i = 0; i < next.length; i++) {
				change = Math.max(change, Math.abs(next[i] - factors[i]));
			}
			factors = next;
			if (change < SETTLED) {
				break;
			}
			place = new Search(shape, points.with(factors), measure).from(place.at(), -1);
		}
		return place;
	}

	private static double scatter(double[] deviations) {
		double[] sizes = Arrays.stream(deviations).map(Math::abs).sorted().toArray();
		int half = sizes.length / 2;
		double median = sizes.length % 2 == 1 ? sizes[half] : (sizes[half - 1] + sizes[half]) / 2;
		return median / NORMAL_MEDIAN;
	}

	private static double[] factors(double[] deviations, double scatter) {
		double bend = BEND * scatter;
		return Arrays.stream(deviations).map(d -> Math.abs(d) <= bend || bend == 0 ? 1 : Math.sqrt(bend / Math.abs(d)))
				.toArray();
	}

	/**
	 * The mean square deviation to go with the unweighted inverse of J'J: the mean square of the bounded deviations over the
	 * squared share of points that are not bounded.
	 *
	 * @param deviations each multiplied by its factor
	 */
	public static double meanSquare(double[] deviations, double[] factors, int degreesOfFreedom) {
		double sum = 0;
		int whole = 0;
		for (int i = 0; i < deviations.length; i++) {
			double bounded = factors[i] * deviations[i];
			sum += bounded * bounded;
			whole += factors[i] == 1 ? 1 : 0;
		}
		double share = (double) whole / deviations.length;
		return sum / degreesOfFreedom / (share * share);
	}
}
