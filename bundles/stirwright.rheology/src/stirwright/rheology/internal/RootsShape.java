package stirwright.rheology.internal;

import java.util.Arrays;
import java.util.List;

/** Casson's: sqrt(stress) = sqrt(yieldStress) + sqrt(plasticViscosity * rate). */
public final class RootsShape implements Shape {

	@Override
	public Scale[] scales() {
		return new Scale[] { Scale.ROOT, Scale.ROOT };
	}

	@Override
	public double lower(int coordinate) {
		return 0;
	}

	@Override
	public double stress(double rate, double logRate, double[] at, double[] gradient) {
		double rootRate = Math.sqrt(rate);
		double root = at[0] + at[1] * rootRate;
		gradient[0] = 2 * root;
		gradient[1] = 2 * root * rootRate;
		return root * root;
	}

	/** The straight line through the square roots, each with the weight that a small deviation of the stress has. */
	@Override
	public List<double[]> starts(Points points) {
		double[] ones = new double[points.size()];
		Arrays.fill(ones, 1);
		double[] roots = Arrays.stream(points.stresses()).map(Math::sqrt).toArray();
		double[] weights = new double[roots.length];
		Arrays.setAll(weights, i -> 2 * roots[i] * points.weights()[i]);
		Points straight = new Points(points.rates(), points.logRates(), roots, weights, points.factors());
		TwoTerms best = TwoTerms.of(straight, ones, Arrays.stream(points.rates()).map(Math::sqrt).toArray());
		return List.of(new double[] { best.first(), best.second() });
	}
}
