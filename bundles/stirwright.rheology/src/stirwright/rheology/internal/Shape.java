package stirwright.rheology.internal;

import java.util.List;

/** A model as a search sees it: coordinates with bounds, stress with its gradient, and where to start. */
public interface Shape {

	/** One for each coordinate, in the order of the model's parameters. */
	Scale[] scales();

	/** The least value of a coordinate. */
	default double lower(int coordinate) {
		return Double.NEGATIVE_INFINITY;
	}

	/** The greatest value of a coordinate. */
	default double upper(int coordinate) {
		return Double.POSITIVE_INFINITY;
	}

	/**
	 * The stress in Pa.
	 *
	 * @param rate     shear rate in 1/s
	 * @param logRate  its natural logarithm
	 * @param at       the coordinates; may lie outside the bounds
	 * @param gradient is filled with the derivatives of the stress with respect to the coordinates
	 */
	double stress(double rate, double logRate, double[] at, double[] gradient);

	/** Whether the stress is a sum of coordinates times known functions of the rate, so that every interval is straight. */
	default boolean linear() {
		return false;
	}

	/** Coordinates to start from, within the bounds, each in a valley of its own; the lowest valley is among them. */
	List<double[]> starts(Points points);
}
