package stirwright.rheology;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.stream.Stream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

import stirwright.rheology.internal.LeastSquares;

/**
 * NIST's certified sets of nonlinear regression, from both of its starting points, through the search that fits fluid models.
 * Certified are eleven digits of each parameter, of its standard deviation and of the residual sum of squares.
 */
class CertifiedSetsTest {

	/** Nine digits of eleven; the worst, Lanczos2, has terms that are nearly alike. */
	private static final double TOLERANCE = 1e-9;

	/** Its residuals are those of points that were printed to fourteen digits: double precision has none left for them. */
	private static final String WITHOUT_RESIDUALS = "Lanczos1";

	@ParameterizedTest(name = "{0} from start {1}")
	@MethodSource
	void certified(String set, int start) {
		double[][] points = Resource.rows("nist/" + set + ".csv").stream()
				.map(row -> row.values().stream().mapToDouble(Double::parseDouble).toArray()).toArray(double[][]::new);
		List<Map<String, String>> parameters = Resource.rows("nist-certified.csv").stream()
				.filter(row -> row.get("set").equals(set)).toList();
		LeastSquares.Minimum minimum = LeastSquares.toTheLastDigit(CertifiedModels.deviations(set, points),
				parameters.stream().mapToDouble(row -> Resource.number(row, "start" + start)).toArray());

		double[][] inverse = LeastSquares.inverseNormal(minimum.jacobian());
		double meanSquare = minimum.sum() / (points.length - parameters.size());
		for (int j = 0; j < parameters.size(); j++) {
			String name = parameters.get(j).get("parameter");
			assertClose(Resource.number(parameters.get(j), "certified"), minimum.at()[j], name);
			if (!set.equals(WITHOUT_RESIDUALS)) {
				assertClose(Resource.number(parameters.get(j), "standard_deviation"), Math.sqrt(inverse[j][j] * meanSquare),
						"standard deviation of " + name);
			}
		}
		if (!set.equals(WITHOUT_RESIDUALS)) {
			double certified = Resource.number(set(set), "residual_sum_of_squares");
			assertClose(certified, minimum.sum(), "residual sum of squares");
		}
	}

	static Stream<Arguments> certified() {
		return Resource.rows("nist-sets.csv").stream().map(row -> row.get("set"))
				.flatMap(set -> Stream.of(Arguments.of(set, 1), Arguments.of(set, 2)));
	}

	@Test
	void all27() {
		// NIST lists 27 sets of nonlinear regression
		assertEquals(27, Resource.rows("nist-sets.csv").size());
	}

	private static Map<String, String> set(String name) {
		return Resource.rows("nist-sets.csv").stream().filter(row -> row.get("set").equals(name)).findFirst().orElseThrow();
	}

	private static void assertClose(double certified, double found, String what) {
		assertTrue(Math.abs(found - certified) <= TOLERANCE * Math.abs(certified), what + ": " + found + ", certified " + certified);
	}
}
