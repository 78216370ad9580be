package stirwright.rheology.internal;

import java.util.List;

/** stress = viscosity * rate. */
public final class LineShape implements Shape {

	@Override
	public Scale[] scales() {
		return new Scale[] { Scale.PLAIN };
	}

	@Override
	public double lower(int coordinate) {
		return 0;
	}

	@Override
	public double stress(double rate, double logRate, double[] at, double[] gradient) {
		gradient[0] = rate;
		return at[0] * rate;
	}

	@Override
	public boolean linear() {
		return true;
	}

	@Override
	public List<double[]> starts(Points points) {
		double overlap = 0;
		double square = 0;
		for (int i = 0; i < points.size(); i++) {
			double weight = points.weights()[i] * points.weights()[i];
			overlap += weight * points.rates()[i] * points.stresses()[i];
			square += weight * points.rates()[i] * points.rates()[i];
		}
		return List.of(new double[] { overlap / square });
	}
}
