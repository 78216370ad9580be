package stirwright.rheology;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class YieldBoundsTest {

	private static final FluidModel YIELDING = new HerschelBulkley(7, 2, 0.5);

	private static Fluid fluid(FluidModel model, double low, double high) {
		return new Fluid(model, 1000, MeasuredWindow.UNKNOWN, new YieldBounds(low, high));
	}

	@ParameterizedTest
	@CsvSource({ "5, 9", "7, 7", "0, NaN", "NaN, 7", "NaN, NaN" })
	void holdTheYieldStress(double low, double high) {
		assertEquals(new YieldBounds(low, high), fluid(YIELDING, low, high).yieldBounds());
	}

	@ParameterizedTest
	@CsvSource({
			"-1, 9, 'yield_stress_low = -1.0: must be a finite number, 0 or greater'",
			"5, Infinity, 'yield_stress_high = Infinity: must be a finite number, 0 or greater'",
			"9, 8, 'yield_stress_high = 8.0: must not be below yield_stress_low, which is 9.0'",
			"7.5, NaN, 'yield_stress_low = 7.5: must not be above the yield stress, which is 7.0'",
			"NaN, 6.5, 'yield_stress_high = 6.5: must not be below the yield stress, which is 7.0'" })
	void refused(double low, double high, String message) {
		assertEquals(message, assertThrows(ParameterException.class, () -> fluid(YIELDING, low, high)).getMessage());
	}

	@Test
	void onlyForAModelWithAYieldStress() {
		assertEquals("yield_stress_low = 0.0: must be left out: the model power-law has no yield stress",
				assertThrows(ParameterException.class, () -> fluid(new PowerLaw(2, 0.5), 0, 1)).getMessage());
		assertEquals("yield_stress_high = 1.0: must be left out: the model newtonian has no yield stress",
				assertThrows(ParameterException.class, () -> fluid(new Newtonian(1), Double.NaN, 1)).getMessage());
		// The model may yield even where its yield stress happens to be 0.
		assertTrue(fluid(new Bingham(0, 1), 0, 3).yieldBounds().known());
	}

	@Test
	void nothingIsKnownUnlessGiven() {
		Fluid fluid = new Fluid(YIELDING, 1000, MeasuredWindow.UNKNOWN);
		assertEquals(YieldBounds.UNKNOWN, fluid.yieldBounds());
		assertFalse(fluid.yieldBounds().known());
	}

	@ParameterizedTest
	@CsvSource({
			"5, 9, 60, 5, 60",
			"5, 9, 8, 5, 9",
			"5, NaN, 60, 5, 60",
			"NaN, NaN, 7, NaN, 7",
			"NaN, NaN, 6, NaN, NaN",
			"5, 9, NaN, 5, 9" })
	void theStaticOneIsTheHigherEndWhereItIsTheHighest(double low, double high, double atRest, double least, double most) {
		YieldBounds bounds = new YieldBounds(low, high, atRest);
		Fluid fluid = new Fluid(YIELDING, 1000, MeasuredWindow.UNKNOWN, bounds);
		assertEquals(bounds, fluid.yieldBounds(), "as given");
		assertEquals(new YieldBounds(least, most, atRest), fluid.yieldRange());
	}

	@Test
	void aStaticOneGoesWithAnyModelAndIsNotNegative() {
		YieldBounds gel = new YieldBounds(Double.NaN, Double.NaN, 30);
		assertFalse(gel.known(), "no end of the running product's range");
		assertEquals(30, new Fluid(new PowerLaw(2, 0.5), 1000, MeasuredWindow.UNKNOWN, gel).yieldRange().high());
		for (double wrong : new double[] { -1, Double.POSITIVE_INFINITY }) {
			assertEquals("static_yield_stress = " + wrong + ": must be a finite number, 0 or greater",
					assertThrows(ParameterException.class, () -> new YieldBounds(5, 9, wrong)).getMessage());
		}
	}

	@Test
	void anotherYieldStressLeavesTheRest() {
		MeasuredWindow window = new MeasuredWindow(1, 100);
		Fluid fluid = new Fluid(YIELDING, 1100, window, new YieldBounds(5, 9));
		assertEquals(new Fluid(new HerschelBulkley(9, 2, 0.5), 1100, window), fluid.withYieldStress(9));
		assertEquals(new Casson(0, 3), new Fluid(new Casson(1, 3), 1000, window).withYieldStress(0).model());
		assertThrows(ParameterException.class, () -> fluid.withYieldStress(-1));
		Fluid thin = new Fluid(new PowerLaw(2, 0.5), 1000, window);
		assertThrows(IllegalStateException.class, () -> thin.withYieldStress(1));
	}
}
