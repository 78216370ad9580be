package stirwright.rheology.internal;

/** Carreau's thinning, (1 + x^2)^((n - 1) / 2). */
public final class CarreauShape extends PlateausShape {

	@Override
	double thinning(double log, double n, double[] gradient) {
		double square = Math.exp(2 * log);
		double logSum = Double.isInfinite(square) ? 2 * log : Math.log1p(square);
		double left = Math.exp((n - 1) / 2 * logSum);
		gradient[2] = (n - 1) * left / (1 + 1 / square);
		gradient[3] = left * logSum / 2;
		return left;
	}
}
