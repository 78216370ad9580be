package stirwright.rheology;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class FlowCurveTest {

	@Test
	void sortedByRateWithEqualRatesInTheirOrder() {
		FlowCurve curve = FlowCurve.of(new double[] { 100, 1, 10, 1 }, new double[] { 7, 3, 5, 2 });
		assertArrayEquals(new double[] { 1, 1, 10, 100 }, curve.shearRates());
		assertArrayEquals(new double[] { 3, 2, 5, 7 }, curve.stresses());
		assertEquals(4, curve.size());
		assertEquals(10, curve.shearRate(2));
		assertEquals(5, curve.stress(2));
		assertEquals(3, curve.differentShearRates());
		assertEquals(new MeasuredWindow(1, 100), curve.window());
	}

	@Test
	void laterChangesOutsideDoNotReachIt() {
		double[] rates = { 1, 2, 3 };
		double[] stresses = { 4, 5, 6 };
		FlowCurve curve = FlowCurve.of(rates, stresses);
		rates[0] = 99;
		stresses[0] = 99;
		curve.shearRates()[1] = 99;
		curve.stresses()[1] = 99;
		assertArrayEquals(new double[] { 1, 2, 3 }, curve.shearRates());
		assertArrayEquals(new double[] { 4, 5, 6 }, curve.stresses());
	}

	@ParameterizedTest
	@ValueSource(doubles = { 0, -2, Double.NaN, Double.POSITIVE_INFINITY })
	void aBadValueIsNamedByItsPointAsGiven(double bad) {
		double[] good = { 30, 20, 10 };
		double[] withBad = { 3, 2, bad };
		assertRefused("point 3: shear rate = " + bad + " 1/s: must be a finite number greater than 0", withBad, good);
		assertRefused("point 3: stress = " + bad + " Pa: must be a finite number greater than 0", good, withBad);
	}

	@Test
	void tooFewOrUnequalNumbers() {
		assertRefused("a flow curve needs at least 3 points, not 2", new double[] { 1, 2 }, new double[] { 1, 2 });
		assertRefused("3 shear rates, but 2 stresses", new double[] { 1, 2, 3 }, new double[] { 1, 2 });
	}

	private static void assertRefused(String message, double[] rates, double[] stresses) {
		IllegalArgumentException refusal =
				assertThrows(IllegalArgumentException.class, () -> FlowCurve.of(rates, stresses));
		assertEquals(message, refusal.getMessage());
	}
}
