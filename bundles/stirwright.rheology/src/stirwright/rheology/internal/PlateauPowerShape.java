package stirwright.rheology.internal;

import java.util.List;

/** Sisko's: stress = infinite * rate + consistency * rate^n, with n from 0 to 1. */
public final class PlateauPowerShape implements Shape {

	private static final int INDEX = 2;

	@Override
	public Scale[] scales() {
		return new Scale[] { Scale.PLAIN, Scale.LOG, Scale.PLAIN };
	}

	@Override
	public double lower(int coordinate) {
		return coordinate == 0 ? 0 : coordinate == INDEX ? LeastIndex.VALUE : Double.NEGATIVE_INFINITY;
	}

	@Override
	public double upper(int coordinate) {
		return coordinate == INDEX ? 1 : Double.POSITIVE_INFINITY;
	}

	@Override
	public double stress(double rate, double logRate, double[] at, double[] gradient) {
		double power = Math.exp(at[1] + at[INDEX] * logRate);
		gradient[0] = rate;
		gradient[1] = power;
		gradient[INDEX] = power * logRate;
		return at[0] * rate + power;
	}

	@Override
	public List<double[]> starts(Points points) {
		return ExponentScan.starts(points, points.rates(), 0.01, 0.99,
				(n, terms, reference) -> new double[] { terms.first(), Math.log(terms.second()) - n * reference, n });
	}
}
