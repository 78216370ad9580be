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
	private static final double ROUGH_TOLERANCE = 1e-7;
	private static final int MOST_ITERATIONS = 300;
	private static final int MOST_ROUGH_ITERATIONS = 50;

	/** Stands for a deviation that is no number: so large that the search turns back, with a square that is finite. */
	private static final double HUGE = 1e100;

	private static final int MOST_LAST_STEPS = 4;

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

	/** Searches from a start, to a relative 1e-7 or so of the sum; never returns a place above the start. */
	public static Minimum roughly(Deviations function, double[] start) {
		LeastSquares search = new LeastSquares(function);
		search.evaluate(start);
		if (start.length > 0) {
			search.search(start, ROUGH_TOLERANCE, MOST_ROUGH_ITERATIONS);
		}
		return search.best;
	}

	/** Searches from a start, with steps of Gauss and Newton's at the end, which find the last digits. */
	public static Minimum toTheLastDigit(Deviations function, double[] start) {
		LeastSquares search = new LeastSquares(function);
		search.evaluate(start);
		if (start.length > 0) {
			search.search(start, TOLERANCE, MOST_ITERATIONS);
			search.lastSteps();
		}
		return search.best;
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

	private void lastSteps() {
		double shorter = Double.POSITIVE_INFINITY;
		for (int i = 0; i < MOST_LAST_STEPS; i++) {
			double[] step = step(best);
			double length = relativeLength(step, best.at());
			if (!(length < shorter / 2)) {
				return;
			}
			shorter = length;
			double[] next = best.at().clone();
			Arrays.setAll(next, j -> next[j] - step[j]);
			Minimum before = best;
			Minimum there = evaluate(next);
			// A step that only rounding makes worse goes to where the gradient is 0, closer than the sum can tell.
			if (there.sum() > before.sum() * (1 + 1e-14)) {
				return;
			}
			best = there;
		}
	}

	private static double[] step(Minimum from) {
		if (from.deviations().length < from.at().length) {
			return new double[from.at().length];
		}
		double[] sizes = columnSizes(from.jacobian());
		DecompositionSolver solver = new QRDecomposition(scaled(from.jacobian(), sizes)).getSolver();
		if (!solver.isNonSingular()) {
			return new double[from.at().length];
		}
		double[] step = solver.solve(new ArrayRealVector(from.deviations(), false)).toArray();
		Arrays.setAll(step, j -> step[j] / sizes[j]);
		return step;
	}

	private static double relativeLength(double[] step, double[] at) {
		double most = 0;
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
