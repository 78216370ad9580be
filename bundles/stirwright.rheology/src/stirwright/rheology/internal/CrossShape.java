package stirwright.rheology.internal;

/** Cross's thinning, 1 / (1 + x^(1 - n)). */
public final class CrossShape extends PlateausShape {

	@Override
	double thinning(double log, double n, double[] gradient) {
		double z = Math.exp((1 - n) * log);
		double left = 1 / (1 + z);
		double slope = left * (1 - left);
		gradient[2] = -(1 - n) * slope;
		gradient[3] = log * slope;
		return left;
	}
}
