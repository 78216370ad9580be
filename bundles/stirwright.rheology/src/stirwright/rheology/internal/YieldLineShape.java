package stirwright.rheology.internal;

import java.util.Arrays;
import java.util.List;

/** stress = yieldStress + plasticViscosity * rate. */
public final class YieldLineShape implements Shape {

	@Override
	public Scale[] scales() {
		return new Scale[] { Scale.PLAIN, Scale.PLAIN };
	}

	@Override
	public double lower(int coordinate) {
		return 0;
	}

	@Override
	public double stress(double rate, double logRate, double[] at, double[] gradient) {
		gradient[0] = 1;
		gradient[1] = rate;
		return at[0] + at[1] * rate;
	}

	@Override
	public boolean linear() {
		return true;
	}

	@Override
	public List<double[]> starts(Points points) {
		double[] ones = new double[points.size()];
		Arrays.fill(ones, 1);
		TwoTerms best = TwoTerms.of(points, ones, points.rates());
		return List.of(new double[] { best.first(), best.second() });
	}
}
