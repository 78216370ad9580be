package stirwright.rheology;

/** What a fit makes as small as it can: the sum over all points of the square of a deviation. */
public enum Objective {

	/** (fitted - measured) / measured, dimensionless. Every decade of stress counts alike. */
	RELATIVE {
		@Override
		public double weight(double measuredStress) {
			return 1 / measuredStress;
		}
	},

	/** fitted - measured, in Pa. The large stresses count most; many published parameters come from it. */
	ABSOLUTE {
		@Override
		public double weight(double measuredStress) {
			return 1;
		}
	};

	/** The factor that turns the difference of fitted and measured stress, in Pa, into this objective's deviation. */
	public abstract double weight(double measuredStress);

	/** The sum of squared deviations of a model from a curve: Pa^2 or dimensionless. */
	public double residualSumOfSquares(FluidModel model, FlowCurve curve) {
		double sum = 0;
		for (int i = 0; i < curve.size(); i++) {
			double deviation = (model.stress(curve.shearRate(i)) - curve.stress(i)) * weight(curve.stress(i));
			sum += deviation * deviation;
		}
		return sum;
	}
}
