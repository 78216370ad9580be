package stirwright.rheology.internal;

/**
 * How a coordinate that is searched over relates to the parameter of the model. Each rises with its parameter, so an
 * interval of one is an interval of the other.
 */
public enum Scale {

	/** The parameter itself: for those that may be 0. */
	PLAIN {
		@Override
		public double parameter(double coordinate) {
			return coordinate;
		}

		@Override
		public double coordinate(double parameter) {
			return parameter;
		}

		@Override
		public double slope(double coordinate) {
			return 1;
		}
	},

	/** The natural logarithm: for those that are greater than 0 and known to a factor. */
	LOG {
		@Override
		public double parameter(double coordinate) {
			return Math.exp(coordinate);
		}

		@Override
		public double coordinate(double parameter) {
			return Math.log(parameter);
		}

		@Override
		public double slope(double coordinate) {
			return Math.exp(coordinate);
		}
	},

	/** The square root, 0 or greater. */
	ROOT {
		@Override
		public double parameter(double coordinate) {
			return coordinate * coordinate;
		}

		@Override
		public double coordinate(double parameter) {
			return Math.sqrt(parameter);
		}

		@Override
		public double slope(double coordinate) {
			return 2 * coordinate;
		}
	};

	/** The parameter at a coordinate. */
	public abstract double parameter(double coordinate);

	/** The coordinate of a parameter. */
	public abstract double coordinate(double parameter);

	/** d parameter / d coordinate. */
	public abstract double slope(double coordinate);
}
