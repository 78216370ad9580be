package stirwright.rheology;

import java.util.Arrays;

import org.apache.commons.math3.stat.regression.SimpleRegression;

import stirwright.rheology.internal.LinearPart;
import stirwright.rheology.internal.Solution;
import stirwright.rheology.internal.YieldPowerLawFit;

/**
 * Least-squares fits of fluid models to a measured flow curve.
 *
 * <p>Every fit throws {@link ParameterException} when the best parameters lie outside the model's limits, for example a
 * flow index below 0 for stresses that fall as the shear rate rises: the model does not describe such a curve, and a
 * parameter moved to its limit would hide that. The yield stress alone is held at 0 or above.
 */
public final class Fits {

	private Fits() {
	}

	/**
	 * The straight line through ln(stress) against ln(rate): the way most published power-law parameters were found.
	 *
	 * <p>It minimises the sum of squares of ln(fitted / measured). Where the curve fits well, that is close to
	 * {@link Objective#RELATIVE}, which the result's residual is therefore given in; {@link #powerLaw} may find a
	 * smaller one.
	 *
	 * @throws IllegalArgumentException if all points have the same shear rate
	 * @throws ParameterException       if the best flow index is out of its limits
	 */
	public static Fit powerLawLogLog(FlowCurve curve) {
		requireDifferentRates(curve, 2);
		SimpleRegression line = new SimpleRegression();
		for (int i = 0; i < curve.size(); i++) {
			line.addData(Math.log(curve.shearRate(i)), Math.log(curve.stress(i)));
		}
		FluidModel model = new PowerLaw(Math.exp(line.getIntercept()), line.getSlope());
		return Fit.of(model, curve, Objective.RELATIVE);
	}

	/**
	 * The power law with the smallest residual.
	 *
	 * @throws IllegalArgumentException if all points have the same shear rate
	 * @throws ParameterException       if the best flow index is out of its limits
	 */
	public static Fit powerLaw(FlowCurve curve, Objective objective) {
		requireDifferentRates(curve, 2);
		Solution best = YieldPowerLawFit.withoutYield(linearPart(curve, objective));
		return Fit.of(new PowerLaw(best.consistency(), best.flowIndex()), curve, objective);
	}

	/**
	 * The Herschel-Bulkley model with the smallest residual. Its residual never exceeds that of {@link #powerLaw} under
	 * the same objective; a yield stress of exactly 0 means that the power law fits best.
	 *
	 * @throws IllegalArgumentException if the points have fewer than three different shear rates
	 * @throws ParameterException       if the best flow index is out of its limits, or the consistency is 0 because all
	 *                                  stresses are equal
	 */
	public static Fit herschelBulkley(FlowCurve curve, Objective objective) {
		requireDifferentRates(curve, 3);
		Solution best = YieldPowerLawFit.withYield(linearPart(curve, objective));
		FluidModel model = new HerschelBulkley(best.yieldStress(), best.consistency(), best.flowIndex());
		return Fit.of(model, curve, objective);
	}

	private static LinearPart linearPart(FlowCurve curve, Objective objective) {
		double[] stresses = curve.stresses();
		return new LinearPart(curve.shearRates(), stresses, Arrays.stream(stresses).map(objective::weight).toArray());
	}

	private static void requireDifferentRates(FlowCurve curve, int needed) {
		int found = curve.differentShearRates();
		if (found < needed) {
			throw new IllegalArgumentException(
					"the fit needs at least " + needed + " different shear rates, the curve has " + found);
		}
	}
}
