package stirwright.rheology.internal;

/**
 * Least squares of stress = first * f + second * g with both factors 0 or greater, in closed form.
 *
 * <p>For given exponents and time constants every model here but Casson's is such a sum, so that a scan over those alone
 * finds the valleys (variable projection; G. H. Golub and V. Pereyra, SIAM Journal on Numerical Analysis 10 (1973) 413,
 * citation from memory).
 *
 * @param first    the factor of f
 * @param second   the factor of g
 * @param residual sum of squared deviations, good to about 1e-8 of the measured sum
 */
record TwoTerms(double first, double second, double residual) {

	static TwoTerms of(Points points, double[] f, double[] g) {
		double ff = 0;
		double fg = 0;
		double gg = 0;
		double fy = 0;
		double gy = 0;
		double yy = 0;
		double[] stresses = points.stresses();
		double[] weights = points.weights();
		for (int i = 0; i < stresses.length; i++) {
			double a = weights[i] * f[i];
			double b = weights[i] * g[i];
			double y = weights[i] * stresses[i];
			ff += a * a;
			fg += a * b;
			gg += b * b;
			fy += a * y;
			gy += b * y;
			yy += y * y;
		}
		double determinant = ff * gg - fg * fg;
		double first = (fy * gg - gy * fg) / determinant;
		double second = (gy * ff - fy * fg) / determinant;
		// The sum of squares is convex and every sum here is positive: where one factor would be negative, or the two
		// cannot be told apart, the constrained minimum has one of them at 0.
		if (first >= 0 && second >= 0 && determinant > 1e-14 * ff * gg) {
			return new TwoTerms(first, second, yy - first * fy - second * gy);
		}
		double alone = yy - fy * fy / ff;
		double other = yy - gy * gy / gg;
		return other <= alone ? new TwoTerms(0, gy / gg, other) : new TwoTerms(fy / ff, 0, alone);
	}
}
