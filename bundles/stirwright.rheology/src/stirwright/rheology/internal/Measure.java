package stirwright.rheology.internal;

/** How far a fitted stress is from a measured one. */
public interface Measure {

	/** The deviation, 0 where both are equal. */
	double deviation(double fitted, double measured);

	/** The derivative of the deviation with respect to the fitted stress. */
	double slope(double fitted, double measured);
}
