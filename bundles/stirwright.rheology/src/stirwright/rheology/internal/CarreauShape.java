package stirwright.rheology.internal;

/** Carreau's thinning, (1 + x^2)^((n - 1) / 2). */
public final class CarreauShape extends PlateausShape {

	/** ln(1 + x^2). */
	@Override
	double bend(double log) {
		double square = Math.exp(2 * log);
		return Double.isInfinite(square) ? 2 * log : Math.log(1 + square);
	}

	@Override
	double left(double bend, double n) {
		return Math.exp((n - 1) / 2 * bend);
	}

	@Override
	void derive(double log, double bend, double left, double n, double[] gradient) {
		gradient[TIME] = (n - 1) * left * (1 - Math.exp(-bend));
		gradient[INDEX] = left * bend / 2;
	}
}
