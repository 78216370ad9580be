package stirwright.rheology.internal;

import java.util.Arrays;
import java.util.List;

/** stress = yieldStress + consistency * rate^n. */
public final class YieldPowerShape implements Shape {

	private static final int YIELD = 0;
	private static final int INDEX = 2;

	/** Towards n = 0 a yield stress and a consistency can no longer be told apart. */
	private static final double LOWEST_INDEX = 0.01;

	/** Beyond the limits of the model, so that an exponent outside them is seen and can be refused. */
	private static final double HIGHEST_INDEX = 4;

	@Override
	public Scale[] scales() {
		return new Scale[] { Scale.PLAIN, Scale.LOG, Scale.PLAIN };
	}

	@Override
	public double lower(int coordinate) {
		return coordinate == YIELD ? 0 : Double.NEGATIVE_INFINITY;
	}

	@Override
	public double stress(double rate, double logRate, double[] at, double[] gradient) {
		double viscous = Math.exp(at[1] + at[INDEX] * logRate);
		gradient[0] = 1;
		gradient[1] = viscous;
		gradient[INDEX] = viscous * logRate;
		return at[YIELD] + viscous;
	}

	@Override
	public List<double[]> starts(Points points) {
		double[] ones = new double[points.size()];
		Arrays.fill(ones, 1);
		return ExponentScan.starts(points, ones, LOWEST_INDEX, HIGHEST_INDEX,
				(n, terms, reference) -> new double[] { terms.first(), Math.log(terms.second()) - n * reference, n });
	}
}
