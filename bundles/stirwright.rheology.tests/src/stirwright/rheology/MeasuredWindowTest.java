package stirwright.rheology;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class MeasuredWindowTest {

	@ParameterizedTest
	@CsvSource({
			"1, 100, 1, 0",
			"1, 100, 100, 0",
			"1, 100, 0.01, 2",    // 1 / 0.01 = 10^2
			"1, 100, 1000, 1",    // 1000 / 100 = 10^1
			"NaN, 100, 1e-9, 0",  // nothing known below
			"NaN, 100, 1e5, 3",
			"1, NaN, 1e9, 0",
			"1, NaN, 0.1, 1",
			"0, 100, 1e-300, 0",
			"1e300, 1e301, 1e-300, 600" })
	void decadesOutside(double min, double max, double rate, double decades) {
		MeasuredWindow window = new MeasuredWindow(min, max);
		assertEquals(decades, window.decadesOutside(rate), 1e-12);
		assertEquals(decades == 0, window.contains(rate));
		assertTrue(window.known());
	}

	@Test
	void unknownBoundsNothing() {
		assertFalse(MeasuredWindow.UNKNOWN.known());
		assertTrue(MeasuredWindow.UNKNOWN.contains(1e12));
		assertEquals(0, MeasuredWindow.UNKNOWN.decadesOutside(1e-12));
	}

	@ParameterizedTest
	@CsvSource({
			"-1, 10, 'shear_rate_min = -1.0: must be a finite number, 0 or greater'",
			"1, 0, shear_rate_max = 0.0: must be a finite number greater than 0",
			"1, Infinity, shear_rate_max = Infinity: must be a finite number greater than 0",
			"10, 1, 'shear_rate_max = 1.0: must not be below shear_rate_min, which is 10.0'" })
	void refused(double min, double max, String message) {
		ParameterException refusal = assertThrows(ParameterException.class, () -> new MeasuredWindow(min, max));
		assertEquals(message, refusal.getMessage());
	}

	@Test
	void rateMustBePositive() {
		MeasuredWindow window = new MeasuredWindow(1, 10);
		assertThrows(IllegalArgumentException.class, () -> window.contains(0));
		assertThrows(IllegalArgumentException.class, () -> window.decadesOutside(Double.NaN));
	}
}
