package stirwright.rheology.internal;

/** Cross's thinning, 1 / (1 + x^(1 - n)). */
public final class CrossShape extends PlateausShape {

	@Override
	double bend(double log) {
		return log;
	}

	@Override
	double left(double bend, double n) {
		return 1 / (1 + Math.exp((1 - n) * bend));
	}

	@Override
	void derive(double log, double bend, double left, double n, double[] gradient) {
		double slope = left * (1 - left);
		gradient[TIME] = -(1 - n) * slope;
		gradient[INDEX] = log * slope;
	}
}
