package stirwright.rheology;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Where one model turns into another, and what is left of each at the two ends of the shear rate. */
class ModelLimitsTest {

	private static final List<Double> RATES = List.of(1e-6, 1e-3, 0.7, 1.0, 42.0, 1e4, 1e7);

	@Test
	void flowIndexOneIsConstantViscosity() {
		assertSame(new Newtonian(3), new PowerLaw(3, 1));
		assertSame(new Newtonian(3), new Carreau(3, 0.1, 5, 1));
		assertSame(new Bingham(2, 3), new HerschelBulkley(2, 3, 1));
		// Cross at n = 1: (t g)^0 = 1, so 1 + (5 - 1) / 2 = 3
		assertSame(new Newtonian(3), new Cross(5, 1, 7, 1));
	}

	@Test
	void flowIndexNearOneIsNearlyConstantViscosity() {
		double n = 1 - 1e-9;
		for (double rate : RATES) {
			assertEquals(3, new PowerLaw(3, n).apparentViscosity(rate), 1e-7);
			assertEquals(3, new Carreau(3, 0.1, 5, n).apparentViscosity(rate), 1e-7);
			assertEquals(3, new Cross(5, 1, 7, n).apparentViscosity(rate), 1e-7);
		}
	}

	@Test
	void withoutYieldStress() {
		assertSame(new PowerLaw(4, 0.3), new HerschelBulkley(0, 4, 0.3));
		assertSame(new Newtonian(4), new Bingham(0, 4));
		assertSame(new Newtonian(4), new Casson(0, 4));
	}

	@Test
	void withoutPlateauAtHighRates() {
		assertSame(new PowerLaw(4, 0.3), new Sisko(0, 4, 0.3));
		assertSame(new Newtonian(5), new Sisko(1, 4, 1));
	}

	@Test
	void withoutTimeConstantOrWithEqualPlateaus() {
		assertSame(new Newtonian(4), new Cross(4, 1, 0, 0.3));
		assertSame(new Newtonian(4), new Carreau(4, 1, 0, 0.3));
		assertSame(new Newtonian(4), new Cross(4, 4, 2, 0.3));
		assertSame(new Newtonian(4), new Carreau(4, 4, 2, 0.3));
	}

	@ParameterizedTest
	@ValueSource(doubles = { 1e-300, 1e-200, 1e-100 })
	void yieldStressIsAllThatIsLeftAtTinyRates(double rate) {
		for (FluidModel model : List.of(new Bingham(7, 2), new HerschelBulkley(7, 2, 0.4), new Casson(7, 2),
				new HerschelBulkley(7, 2, 2))) {
			assertEquals(7, model.stress(rate), 1e-12, model.toString());
			assertEquals(0, model.flowIndex(rate), 1e-12, model.toString());
		}
	}

	@Test
	void cassonKeepsItsSquareRootAtSmallRates() {
		// stress - yield = 2 sqrt(4 * 1e-10) + 1e-10 = 4e-5 + 1e-10; flow index = 1e-5 / (2 + 1e-5)
		assertEquals(4e-5 + 1e-10, new Casson(4, 1).stress(1e-10) - 4, 1e-14);
		assertEquals(4.999975000125e-6, new Casson(4, 1).flowIndex(1e-10), 1e-17);
	}

	@Test
	void yieldStressIsForgottenAtLargeRates() {
		double rate = 1e40;
		assertEquals(1, new Bingham(7, 2).flowIndex(rate), 1e-12);
		assertEquals(0.4, new HerschelBulkley(7, 2, 0.4).flowIndex(rate), 1e-12);
		assertEquals(1, new Casson(7, 2).flowIndex(rate), 1e-12);
	}

	@Test
	void flowIndexSurvivesAStressTooSmallForADouble() {
		// 1e-200 squared, and 1e-200 times 1e-200, are 0 in double precision
		assertEquals(2, new HerschelBulkley(0, 1, 2).flowIndex(1e-200));
		assertEquals(1, new Casson(0, 1e-200).flowIndex(1e-200));
	}

	@Test
	void plateausAtBothEnds() {
		for (FluidModel model : List.of(new Cross(50, 0.02, 3, 0.2), new Carreau(50, 0.02, 3, 0.2))) {
			assertAll(model.toString(),
					() -> assertEquals(50, model.apparentViscosity(1e-30), 1e-12),
					() -> assertEquals(1, model.flowIndex(1e-30), 1e-12),
					() -> assertEquals(0.02, model.apparentViscosity(1e300), 1e-14),
					() -> assertEquals(0.02e300, model.stress(1e300), 1e288),
					() -> assertEquals(1, model.flowIndex(1e300), 1e-12));
		}
	}

	@Test
	void powerLawAtTheEndWithoutSecondPlateau() {
		for (FluidModel model : List.of(new Cross(50, 0, 3, 0.2), new Carreau(50, 0, 3, 0.2))) {
			// far beyond 1/t: 50 * (3 g)^(0.2 - 1)
			double expected = 50 * Math.pow(3e200, -0.8);
			assertEquals(expected, model.apparentViscosity(1e200), 1e-12 * expected, model.toString());
			assertEquals(0.2, model.flowIndex(1e200), 1e-12, model.toString());
		}
	}

	@Test
	void onlyModelsWithAYieldStressHaveOne() {
		assertEquals(7, new Bingham(7, 2).yieldStress());
		assertEquals(7, new HerschelBulkley(7, 2, 0.5).yieldStress());
		assertEquals(7, new Casson(7, 2).yieldStress());
		assertTrue(List.of(new Newtonian(1), new PowerLaw(1, 0.5), new Cross(2, 1, 1, 0.5), new Carreau(2, 1, 1, 0.5))
				.stream().allMatch(model -> model.yieldStress() == 0));
	}

	private static void assertSame(FluidModel expected, FluidModel actual) {
		for (double rate : RATES) {
			double stress = expected.stress(rate);
			double viscosity = expected.apparentViscosity(rate);
			assertEquals(stress, actual.stress(rate), 4e-15 * stress, actual + " at " + rate);
			assertEquals(viscosity, actual.apparentViscosity(rate), 4e-15 * viscosity, actual + " at " + rate);
			assertEquals(expected.flowIndex(rate), actual.flowIndex(rate), 4e-15, actual + " at " + rate);
		}
	}
}
