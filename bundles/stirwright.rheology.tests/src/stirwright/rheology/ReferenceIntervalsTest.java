package stirwright.rheology;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.util.Map;
import java.util.stream.Stream;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Standard errors and profile intervals against an independent computation; see {@code reference-intervals.csv}. */
class ReferenceIntervalsTest {

	@ParameterizedTest(name = "{0} {1} {2}")
	@MethodSource
	void interval(String rheogram, String model, String parameter, Map<String, String> row) throws IOException {
		ModelFit fit = Fits.one(ModelKind.byId(model).orElseThrow(), OpenRheograms.curve(rheogram), FitOptions.DEFAULT);
		Estimate estimate = fit.estimate(parameter);
		double value = Resource.number(row, "value");
		double error = Resource.number(row, "standard_error");
		// the reference has eight digits
		assertEquals(value, estimate.value(), 1e-6 * value);
		assertEquals(error, estimate.standardError(), 1e-5 * error);
		// profile ends are searched to 0.2 % of their distance, which is about two standard errors
		assertEquals(end(row, "low_profile"), estimate.interval().low(), 0.005 * error);
		// the reference is the profile alone; what is proportional to a stress ends higher by twice the mean square deviation
		double pull = parameter.equals("flow_index") ? 1
				: 1 + Math.min(0.25, 2 * fit.residualSumOfSquares() / (fit.points() - fit.estimates().size()));
		assertEquals(pull * end(row, "high_profile"), estimate.interval().high(), 0.005 * error);
	}

	/** What is not reached before the limit ends there, at 0. */
	private static double end(Map<String, String> row, String column) {
		return row.get(column).isEmpty() ? 0 : Resource.number(row, column);
	}

	static Stream<Object[]> interval() {
		return Resource.rows("reference-intervals.csv").stream()
				.map(row -> new Object[] { row.get("rheogram"), row.get("model"), row.get("parameter"), row });
	}
}
