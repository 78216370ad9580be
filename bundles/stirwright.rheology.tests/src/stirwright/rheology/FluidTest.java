package stirwright.rheology;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class FluidTest {

	private static final FluidModel MODEL = new Newtonian(1);

	@ParameterizedTest
	@ValueSource(doubles = { 50, 998.2, 25_000 })
	void densityInKilogramsPerCubicMetre(double density) {
		assertEquals(density, new Fluid(MODEL, density, MeasuredWindow.UNKNOWN).density());
	}

	@ParameterizedTest
	@ValueSource(doubles = { 0.05, 0.998, 1.25, 25 })
	void gramsPerCubicCentimetreAreRecognised(double density) {
		assertRefused(density, "must be from 50 to 25000 kg/m3; the value looks like g/cm3 and must be given in kg/m3");
	}

	@ParameterizedTest
	@ValueSource(doubles = { 0, -1000, 0.04, 49.9, 25_001, Double.NaN, Double.POSITIVE_INFINITY })
	void anythingElseIsRefused(double density) {
		assertRefused(density, "must be from 50 to 25000 kg/m3");
	}

	@Test
	void modelAndWindowAreNeeded() {
		assertThrows(NullPointerException.class, () -> new Fluid(null, 1000, MeasuredWindow.UNKNOWN));
		assertThrows(NullPointerException.class, () -> new Fluid(MODEL, 1000, null));
	}

	private static void assertRefused(double density, String allowed) {
		ParameterException refusal = assertThrows(ParameterException.class,
				() -> new Fluid(MODEL, density, MeasuredWindow.UNKNOWN));
		assertEquals("density", refusal.parameter());
		assertEquals(density, refusal.value());
		assertEquals("density = " + density + ": " + allowed, refusal.getMessage());
	}
}
