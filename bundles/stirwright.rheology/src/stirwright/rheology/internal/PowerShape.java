package stirwright.rheology.internal;

import java.util.List;

import org.apache.commons.math3.stat.regression.SimpleRegression;

/** stress = consistency * rate^n. The exponent is left free, so that one outside every model's limits is seen. */
public final class PowerShape implements Shape {

	@Override
	public Scale[] scales() {
		return new Scale[] { Scale.LOG, Scale.PLAIN };
	}

	@Override
	public double stress(double rate, double logRate, double[] at, double[] gradient) {
		double stress = Math.exp(at[0] + at[1] * logRate);
		gradient[0] = stress;
		gradient[1] = stress * logRate;
		return stress;
	}

	/** The straight line through the logarithms. */
	@Override
	public List<double[]> starts(Points points) {
		SimpleRegression line = new SimpleRegression();
		for (int i = 0; i < points.size(); i++) {
			if (points.weights()[i] > 0) {
				line.addData(points.logRates()[i], Math.log(points.stresses()[i]));
			}
		}
		return List.of(new double[] { line.getIntercept(), line.getSlope() });
	}
}
