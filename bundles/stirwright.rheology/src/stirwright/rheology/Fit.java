package stirwright.rheology;

/**
 * A model fitted to a flow curve, and how well it fits.
 *
 * @param model                the fitted model; a yield stress of exactly 0 means that its limit was reached
 * @param objective            what {@code residualSumOfSquares} sums
 * @param residualSumOfSquares Pa^2 for the absolute objective, dimensionless for the relative one
 * @param rmsRelative          root mean square of (fitted - measured) / measured, whatever the objective
 * @param points               number of measured points
 */
public record Fit(FluidModel model, Objective objective, double residualSumOfSquares, double rmsRelative, int points) {

	/** Measures a model against a curve. */
	public static Fit of(FluidModel model, FlowCurve curve, Objective objective) {
		double relative = Objective.RELATIVE.residualSumOfSquares(model, curve);
		return new Fit(model, objective, objective.residualSumOfSquares(model, curve),
				Math.sqrt(relative / curve.size()), curve.size());
	}
}
