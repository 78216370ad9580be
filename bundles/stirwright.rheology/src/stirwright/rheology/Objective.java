package stirwright.rheology;

/** What a fit makes as small as it can: the sum over all points of the square of a deviation. */
public enum Objective {

	/** (fitted - measured) / measured, dimensionless. Every decade of stress counts alike; the default. */
	RELATIVE {
		@Override
		public double deviation(double fitted, double measured) {
			return (fitted - measured) / measured;
		}

		@Override
		public double slope(double fitted, double measured) {
			return 1 / measured;
		}
	},

	/** fitted - measured, in Pa. The large stresses count most; many published parameters come from it. */
	ABSOLUTE {
		@Override
		public double deviation(double fitted, double measured) {
			return fitted - measured;
		}

		@Override
		public double slope(double fitted, double measured) {
			return 1;
		}
	},

	/** ln(fitted / measured), dimensionless: the straight line through a log-log plot, where most power laws come from. */
	LOGARITHMIC {
		@Override
		public double deviation(double fitted, double measured) {
			return Math.log(fitted / measured);
		}

		@Override
		public double slope(double fitted, double measured) {
			return 1 / fitted;
		}
	},

	/** sqrt(fitted) - sqrt(measured), in Pa^0.5: the straight line through Casson's plot. */
	SQUARE_ROOT {
		@Override
		public double deviation(double fitted, double measured) {
			return Math.sqrt(fitted) - Math.sqrt(measured);
		}

		@Override
		public double slope(double fitted, double measured) {
			return 0.5 / Math.sqrt(fitted);
		}
	};

	/** The deviation of a fitted stress from a measured one, both in Pa. */
	public abstract double deviation(double fitted, double measured);

	/** The derivative of the deviation with respect to the fitted stress. */
	public abstract double slope(double fitted, double measured);

	/** Whether the deviation is a straight line over the fitted stress. */
	boolean linear() {
		return this == RELATIVE || this == ABSOLUTE;
	}

	/** The sum of squared deviations of a model from a curve. */
	public double residualSumOfSquares(FluidModel model, FlowCurve curve) {
		double sum = 0;
		for (int i = 0; i < curve.size(); i++) {
			double deviation = deviation(model.stress(curve.shearRate(i)), curve.stress(i));
			sum += deviation * deviation;
		}
		return sum;
	}
}
