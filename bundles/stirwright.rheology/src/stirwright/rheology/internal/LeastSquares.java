package stirwright.rheology.internal;

import java.util.Arrays;

import org.apache.commons.math3.exception.MathIllegalStateException;
import org.apache.commons.math3.fitting.leastsquares.LeastSquaresFactory;
import org.apache.commons.math3.fitting.leastsquares.LevenbergMarquardtOptimizer;
import org.apache.commons.math3.fitting.leastsquares.MultivariateJacobianFunction;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.DecompositionSolver;
import org.apache.commons.math3.linear.QRDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;
import org.apache.commons.math3.linear.SingularMatrixException;
import org.apache.commons.math3.util.Pair;
import org.apache.commons.math3.util.Precision;

/** Levenberg and Marquardt's method as Commons Math has it, with what a fit needs beside it. Not thread-safe. */
public final class LeastSquares {

	/** Relative, of sum and coordinates: at the end, and on the way, where another search goes on. */
	private static final double TOLERANCE = 1e-11;
	private static final double ROUGH_TOLERANCE = 1e-6;
	private static final int MOST_ITERATIONS = 1000;
	private static final int MOST_ROUGH_ITERATIONS = 25;
	private static final int MOST_SHORT_STEPS = 8;

	/** Stands for a deviation that is no number: so large that the search turns back, with a square that is finite. */
	private static final double HUGE = 1e100;

	/** Steps shrink by a steady factor where deviations stay large; each is a digit or so. */
	private static final int MOST_LAST_STEPS = 50;
	private static final int MOST_STALLED = 3;
	private static final double LAST_DIGIT = 1e-14;
	private static final double CLOSE = 1e-7;

	/** A shortest step no longer than this says that the steps went to a minimum. */
	private static final double NEAR = 1e-10;
	private static final double CLOSE_ENOUGH = 1e-5;

	/** Of a sum of squares, relative: what rounding may do to it. */
	private static final double NOISE = 1e-11;

	/** What is made small: the sum of the squares of its deviations. */
	public interface Deviations {

		/** How many deviations there are. */
		int size();

		/**
		 * @param at         coordinates
		 * @param deviations is filled
		 * @param jacobian   is filled: a row for each deviation, a column for each coordinate
		 */
		void evaluate(double[] at, double[] deviations, double[][] jacobian);
	}

	/**
	 * The lowest place that was seen.
	 *
	 * @param at       coordinates
	 * @param sum      of the squared deviations
	 * @param jacobian there
	 */
	public record Minimum(double[] at, double sum, double[][] jacobian, double[] deviations) {
	}

	private final Deviations function;
	private Minimum best;

	private LeastSquares(Deviations function) {
		this.function = function;
	}

	/** Searches from a start, to a relative 1e-6 or so of the sum; never returns a place above the start. */
	public static Minimum roughly(Deviations function, double[] start) {
		LeastSquares search = new LeastSquares(function);
		if (!search.shortWay(start)) {
			search.search(search.best.at(), ROUGH_TOLERANCE, MOST_ROUGH_ITERATIONS);
		}
		return search.best;
	}

	/** Searches from a start, which may be there already, with steps of Gauss and Newton's, which find the last digits. */
	public static Minimum toTheLastDigit(Deviations function, double[] start) {
		return refined(function, start, LAST_DIGIT, NEAR, TOLERANCE, MOST_ITERATIONS);
	}

	/** The same to a relative 1e-7 of the coordinates. */
	public static Minimum closely(Deviations function, double[] start) {
		return refined(function, start, CLOSE, CLOSE_ENOUGH, ROUGH_TOLERANCE, MOST_ROUGH_ITERATIONS);
	}

	private static Minimum refined(Deviations function, double[] start, double wanted, double near,
			double tolerance, int iterations) {
		LeastSquares search = new LeastSquares(function);
		search.evaluate(start);
		if (start.length > 0 && !(search.lastSteps(wanted) <= near)) {
			search.search(search.best.at(), tolerance, iterations);
			search.lastSteps(wanted);
		}
		return search.best;
	}

	/** Gauss and Newton's steps by the normal equations, while each descends; whether they came to the bottom. */
	private boolean shortWay(double[] start) {
		Minimum here = evaluate(start);
		for (int i = 0; i < MOST_SHORT_STEPS && start.length > 0; i++) {
			double[] step = NormalEquations.step(here.jacobian(), here.deviations());
			if (step == null) {
				return false;
			}
			if (step[start.length] <= ROUGH_TOLERANCE * here.sum()) {
				return true;
			}
			double[] next = here.at().clone();
			Arrays.setAll(next, j -> next[j] - step[j]);
			Minimum there = evaluate(next);
			if (!(there.sum() < here.sum())) {
				return false;
			}
			here = there;
		}
		return start.length == 0;
	}

	private void search(double[] start, double tolerance, int iterations) {
		MultivariateJacobianFunction model = point -> {
			Minimum here = evaluate(point.toArray());
			return new Pair<RealVector, RealMatrix>(new ArrayRealVector(here.deviations(), false),
					new Array2DRowRealMatrix(here.jacobian(), false));
		};
		try {
			new LevenbergMarquardtOptimizer(100, tolerance, tolerance, tolerance, Precision.SAFE_MIN).optimize(
					LeastSquaresFactory.create(model, new ArrayRealVector(function.size()),
							new ArrayRealVector(start, false), null, iterations, iterations));
		} catch (MathIllegalStateException nothingMoreToGain) {
			// Thrown where rounding hides any further descent, and after the last iteration: the lowest place was kept.
			return;
		}
	}

	private Minimum evaluate(double[] at) {
		double[] deviations = new double[function.size()];
		double[][] jacobian = new double[deviations.length][at.length];
		function.evaluate(at, deviations, jacobian);
		double sum = 0;
		for (int i = 0; i < deviations.length; i++) {
			if (!(Math.abs(deviations[i]) < HUGE)) {
				deviations[i] = HUGE;
				Arrays.fill(jacobian[i], 0);
			}
			sum += deviations[i] * deviations[i];
		}
		Minimum here = new Minimum(at, sum, jacobian, deviations);
		if (best == null || sum < best.sum()) {
			best = here;
		}
		return here;
	}

	/** Steps until one is no longer than is wanted; how long the shortest was, relative to the coordinates. */
	private double lastSteps(double wanted) {
		double shortest = Double.POSITIVE_INFINITY;
		int stalled = 0;
		for (int i = 0; i < MOST_LAST_STEPS && stalled < MOST_STALLED; i++) {
			double[] step = step(best);
			double length = relativeLength(step, best.at());
			stalled = length < 0.95 * shortest ? 0 : stalled + 1;
			shortest = Math.min(shortest, length);
			if (!(length > wanted)) {
				return length;
			}
			double[] next = best.at().clone();
			Arrays.setAll(next, j -> next[j] - step[j]);
			Minimum before = best;
			Minimum there = evaluate(next);
			// A step that only rounding makes worse goes to where the gradient is 0, closer than the sum can tell.
			if (there.sum() > before.sum() * (1 + NOISE)) {
				return shortest;
			}
			best = there;
		}
		return shortest;
	}

	/** To the minimum of the linearised sum; of NaN where the columns of the Jacobian cannot be told apart. */
	private static double[] step(Minimum from) {
		double[] step = new double[from.at().length];
		Arrays.fill(step, Double.NaN);
		if (from.deviations().length < from.at().length || step.length == 0) {
			return step;
		}
		double[] sizes = columnSizes(from.jacobian());
		DecompositionSolver solver = new QRDecomposition(scaled(from.jacobian(), sizes)).getSolver();
		if (solver.isNonSingular()) {
			RealVector solved = solver.solve(new ArrayRealVector(from.deviations(), false));
			Arrays.setAll(step, j -> solved.getEntry(j) / sizes[j]);
		}
		return step;
	}

	private static double relativeLength(double[] step, double[] at) {
		double most = step.length == 0 ? 0 : step[0];
		for (int j = 0; j < step.length; j++) {
			most = Math.max(most, Math.abs(step[j]) / (Math.abs(at[j]) + 1e-300));
		}
		return most;
	}

	/**
	 * The inverse of J'J for a Jacobian J, by its triangular factor, so that no digits are squared away.
	 *
	 * @return a square matrix; of NaN where the columns of J cannot be told apart
	 */
	public static double[][] inverseNormal(double[][] jacobian) {
		int size = jacobian[0].length;
		double[] sizes = columnSizes(jacobian);
		double[][] inverse = new double[size][size];
		try {
			RealMatrix r = new QRDecomposition(scaled(jacobian, sizes), 1e-12).getR()
					.getSubMatrix(0, size - 1, 0, size - 1);
			RealMatrix rInverse = new QRDecomposition(r, 1e-12).getSolver().getInverse();
			for (int j = 0; j < size; j++) {
				for (int k = 0; k < size; k++) {
					for (int m = Math.max(j, k); m < size; m++) {
						inverse[j][k] += rInverse.getEntry(j, m) * rInverse.getEntry(k, m);
					}
					inverse[j][k] /= sizes[j] * sizes[k];
				}
			}
		} catch (SingularMatrixException notToBeToldApart) {
			for (double[] row : inverse) {
				Arrays.fill(row, Double.NaN);
			}
		}
		return inverse;
	}

	private static double[] columnSizes(double[][] jacobian) {
		double[] sizes = new double[jacobian[0].length];
		for (double[] row : jacobian) {
			for (int j = 0; j < sizes.length; j++) {
				sizes[j] += row[j] * row[j];
			}
		}
		Arrays.setAll(sizes, j -> sizes[j] > 0 ? Math.sqrt(sizes[j]) : 1);
		return sizes;
	}

	private static RealMatrix scaled(double[][] jacobian, double[] sizes) {
		double[][] scaled = new double[jacobian.length][sizes.length];
		for (int i = 0; i < scaled.length; i++) {
			for (int j = 0; j < sizes.length; j++) {
				scaled[i][j] = jacobian[i][j] / sizes[j];
			}
		}
		return new Array2DRowRealMatrix(scaled, false);
	}
}
