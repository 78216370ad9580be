package stirwright.rheology.internal;

import java.util.function.DoubleFunction;

import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * Weighted least squares of yieldStress + consistency * rate^n.
 *
 * <p>For a given n the stress is linear in the other two parameters, which {@link LinearPart} then finds in closed form.
 * What is left is a search over n alone (variable projection; G. H. Golub and V. Pereyra, SIAM Journal on Numerical
 * Analysis 10 (1973) 413, citation from memory): a scan finds the lowest valley, Brent's method its bottom. There are
 * no starting values to get wrong, and no step can leave the valley.
 */
public final class YieldPowerLawFit {

	/** The scan reaches beyond the limits of every model, so that a result outside them is seen and can be refused. */
	private static final double LOWEST_INDEX = -2;
	private static final double HIGHEST_INDEX = 4;
	private static final double SCAN_STEP = 0.05;

	/** Towards n = 0 a yield stress and a consistency can no longer be told apart. */
	private static final double LOWEST_INDEX_WITH_YIELD = 0.01;

	/** Of n. A flat valley ends the search earlier, where rounding hides any further gain. */
	private static final double RELATIVE_TOLERANCE = 1e-12;
	private static final double ABSOLUTE_TOLERANCE = 1e-14;
	private static final int MAX_EVALUATIONS = 500;

	private YieldPowerLawFit() {
	}

	/** The best solution without a yield stress; its flow index may be negative. */
	public static Solution withoutYield(LinearPart linear) {
		return search(linear::withoutYield, LOWEST_INDEX);
	}

	/**
	 * The best solution with a yield stress and a consistency of 0 or above. It is never worse than
	 * {@link #withoutYield}, because that is one of the solutions it chooses from.
	 */
	public static Solution withYield(LinearPart linear) {
		return withoutYield(linear).orBetter(search(linear::withYield, LOWEST_INDEX_WITH_YIELD));
	}

	private static Solution search(DoubleFunction<Solution> bestAt, double lowestIndex) {
		Solution valley = bestAt.apply(lowestIndex);
		for (double n = lowestIndex + SCAN_STEP; n <= HIGHEST_INDEX; n += SCAN_STEP) {
			valley = valley.orBetter(bestAt.apply(n));
		}
		double n = valley.flowIndex();
		double bottom = new BrentOptimizer(RELATIVE_TOLERANCE, ABSOLUTE_TOLERANCE).optimize(
				new MaxEval(MAX_EVALUATIONS),
				GoalType.MINIMIZE,
				new UnivariateObjectiveFunction(index -> bestAt.apply(index).residual()),
				new SearchInterval(Math.max(lowestIndex, n - SCAN_STEP), n + SCAN_STEP)).getPoint();
		return valley.orBetter(bestAt.apply(bottom));
	}
}
