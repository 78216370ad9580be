package stirwright.rheology.internal;

import java.util.Arrays;
import java.util.stream.IntStream;

/**
 * Measured points as a search needs them. The arrays are taken as they are and not changed.
 *
 * @param rates    1/s, ascending
 * @param logRates their natural logarithms
 * @param stresses Pa
 * @param weights  what turns a small difference of stress into a deviation, factors included
 * @param factors  what each deviation is multiplied by: 1, or less for a point that counts less
 */
public record Points(double[] rates, double[] logRates, double[] stresses, double[] weights, double[] factors) {

	/** Points that all count alike. */
	public static Points of(double[] rates, double[] stresses, double[] weights) {
		double[] ones = new double[rates.length];
		Arrays.fill(ones, 1);
		return new Points(rates, Arrays.stream(rates).map(Math::log).toArray(), stresses, weights, ones);
	}

	/** The same points, each counting as much as its factor says. */
	public Points with(double[] newFactors) {
		double[] newWeights = new double[size()];
		Arrays.setAll(newWeights, i -> weights[i] / factors[i] * newFactors[i]);
		return new Points(rates, logRates, stresses, newWeights, newFactors);
	}

	/** How many. */
	public int size() {
		return rates.length;
	}

	/** Every so-manieth point, the last one included, such that about {@code most} are left. */
	public Points thinned(int most) {
		if (size() <= most) {
			return this;
		}
		int[] kept = IntStream.range(0, most).map(i -> (int) ((long) i * (size() - 1) / (most - 1))).toArray();
		return new Points(pick(rates, kept), pick(logRates, kept), pick(stresses, kept), pick(weights, kept),
				pick(factors, kept));
	}

	private static double[] pick(double[] from, int[] kept) {
		return Arrays.stream(kept).mapToDouble(i -> from[i]).toArray();
	}
}
