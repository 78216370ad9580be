package stirwright.rheology.internal;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.CholeskyDecomposition;
import org.apache.commons.math3.linear.NonPositiveDefiniteMatrixException;
import org.apache.commons.math3.linear.RealVector;

/** The quick way to a step of Gauss and Newton's; it squares the condition of the Jacobian, so that it has half the digits. */
final class NormalEquations {

	private static final double SYMMETRIC = 1e-12;

	/** Of the scaled matrix, whose diagonal is 1. */
	private static final double POSITIVE = 1e-12;

	private NormalEquations() {
	}

	/**
	 * The step that is to be taken off the coordinates, and behind it by how much the linearised sum falls; null where the
	 * columns of the Jacobian cannot be told apart.
	 */
	static double[] step(double[][] jacobian, double[] deviations) {
		int size = jacobian[0].length;
		double[][] normal = new double[size][size];
		double[] downhill = new double[size];
		for (int i = 0; i < deviations.length; i++) {
			double[] row = jacobian[i];
			for (int j = 0; j < size; j++) {
				downhill[j] += row[j] * deviations[i];
				for (int k = 0; k <= j; k++) {
					normal[j][k] += row[j] * row[k];
				}
			}
		}
		double[] sizes = new double[size];
		for (int j = 0; j < size; j++) {
			sizes[j] = normal[j][j] > 0 ? Math.sqrt(normal[j][j]) : 1;
		}
		double[] right = new double[size];
		for (int j = 0; j < size; j++) {
			right[j] = downhill[j] / sizes[j];
			for (int k = 0; k <= j; k++) {
				normal[j][k] /= sizes[j] * sizes[k];
				normal[k][j] = normal[j][k];
			}
		}
		try {
			RealVector solved = new CholeskyDecomposition(new Array2DRowRealMatrix(normal, false), SYMMETRIC, POSITIVE).getSolver()
					.solve(new ArrayRealVector(right, false));
			double[] step = new double[size + 1];
			for (int j = 0; j < size; j++) {
				step[j] = solved.getEntry(j) / sizes[j];
				step[size] += step[j] * downhill[j];
			}
			return step;
		} catch (NonPositiveDefiniteMatrixException notToBeToldApart) {
			return null;
		}
	}
}
