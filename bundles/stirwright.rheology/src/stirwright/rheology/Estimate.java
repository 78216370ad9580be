package stirwright.rheology;

/**
 * A fitted parameter and how well the points give it.
 *
 * @param parameter     which one
 * @param value         in the parameter's unit
 * @param standardError in the same unit, by linearising the model at its best place; NaN where the points do not give it,
 *                      and for a parameter that is held at its limit
 * @param interval      of 95 %, for this parameter alone. Under the relative objective the upper end of what is proportional
 *                      to a stress is moved up by twice the mean square deviation, by which such a fit is too low
 * @param joint         of 95 %, for all parameters of the model at once (Scheffé), by linearising; NONE where
 *                      {@code standardError} is NaN
 * @param method        where {@code interval} comes from
 * @param atLimit       whether the parameter is held at its limit, 0 for a yield stress
 */
public record Estimate(Parameter parameter, double value, double standardError, Interval interval, Interval joint,
		Method method, boolean atLimit) {

	/** Ways to an interval. */
	public enum Method {

		/** By the sum of squares as this parameter moves and all others follow; valid at a limit too. */
		PROFILE,

		/** By linearising the model at its best place. */
		LINEAR,

		/** There is none. */
		NONE
	}
}
