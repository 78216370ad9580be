package stirwright.rheology.internal;

import java.util.Arrays;

/** The best yield stress and consistency of yieldStress + consistency * rate^n for a given n, in closed form. */
public final class LinearPart {

	private final double[] shearRates;
	private final double[] stresses;
	private final double[] weights;
	private final double referenceRate;

	/**
	 * @param shearRates 1/s, greater than 0
	 * @param stresses   Pa, greater than 0
	 * @param weights    factors of the deviations, before they are squared
	 */
	public LinearPart(double[] shearRates, double[] stresses, double[] weights) {
		this.shearRates = shearRates.clone();
		this.stresses = stresses.clone();
		this.weights = weights.clone();
		this.referenceRate = Math.exp(Arrays.stream(shearRates).map(Math::log).average().orElseThrow());
	}

	/** The best consistency alone. */
	Solution withoutYield(double n) {
		double[] power = powers(n);
		double overlap = 0;
		double square = 0;
		for (int i = 0; i < power.length; i++) {
			double squaredWeight = weights[i] * weights[i];
			overlap += squaredWeight * power[i] * stresses[i];
			square += squaredWeight * power[i] * power[i];
		}
		return solution(0, overlap / square, n);
	}

	/** The best pair, neither below 0. */
	Solution withYield(double n) {
		double[] power = powers(n);
		double meanPower = weightedMean(power);
		double meanStress = weightedMean(stresses);
		double covariance = 0;
		double variance = 0;
		for (int i = 0; i < power.length; i++) {
			double squaredWeight = weights[i] * weights[i];
			double distance = power[i] - meanPower;
			covariance += squaredWeight * distance * (stresses[i] - meanStress);
			variance += squaredWeight * distance * distance;
		}
		double slope = covariance / variance;
		if (!(slope > 0)) {
			return solution(meanStress, 0, n);
		}
		double yieldStress = meanStress - slope * meanPower;
		// The sum of squares is convex and all stresses are positive: where one of the two would be negative, the
		// constrained minimum has that one at 0.
		return yieldStress >= 0 ? solution(yieldStress, slope, n) : withoutYield(n);
	}

	/** rate^n with the rates over their geometric mean, which keeps the sums of comparable size for every n. */
	private double[] powers(double n) {
		return Arrays.stream(shearRates).map(rate -> Math.pow(rate / referenceRate, n)).toArray();
	}

	private double weightedMean(double[] values) {
		double sum = 0;
		double total = 0;
		for (int i = 0; i < values.length; i++) {
			double squaredWeight = weights[i] * weights[i];
			sum += squaredWeight * values[i];
			total += squaredWeight;
		}
		return sum / total;
	}

	/**
	 * The residual is computed as the objective computes it for a finished model, operation by operation: two solutions
	 * that differ by rounding alone then compare alike here and there.
	 */
	private Solution solution(double yieldStress, double scaledConsistency, double n) {
		double consistency = scaledConsistency * Math.pow(referenceRate, -n);
		double residual = 0;
		for (int i = 0; i < shearRates.length; i++) {
			double stress = yieldStress + consistency * Math.pow(shearRates[i], n);
			double deviation = (stress - stresses[i]) * weights[i];
			residual += deviation * deviation;
		}
		return new Solution(yieldStress, consistency, n, residual);
	}
}
