package stirwright.rheology;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.stream.Stream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What must hold for every model whatever its parameters. */
class ModelPropertiesTest {

	private static final int MODELS_PER_KIND = 200;

	private final RandomModels random = new RandomModels(20240611);

	@Test
	void localFlowIndexIsTheSlopeOfLogStress() {
		double step = 1e-4;
		random.each(MODELS_PER_KIND).forEach(model -> {
			double rate = random.between(1e-4, 1e5);
			double above = Math.log(model.stress(rate * Math.exp(step)));
			double below = Math.log(model.stress(rate * Math.exp(-step)));
			// central difference: truncation about step^2 / 6, rounding about 1e-15 / step
			assertEquals((above - below) / (2 * step), model.flowIndex(rate), 1e-8, model + " at " + rate);
		});
	}

	@Test
	void stressRisesWithShearRate() {
		random.each(MODELS_PER_KIND).forEach(model -> {
			double rate = random.between(1e-4, 1e5);
			assertTrue(model.stress(1.01 * rate) > model.stress(rate), model + " at " + rate);
		});
	}

	@Test
	void stressIsViscosityTimesRateAndNeverBelowYield() {
		random.each(MODELS_PER_KIND).forEach(model -> {
			double rate = random.between(1e-12, 1e12);
			double stress = model.stress(rate);
			assertEquals(stress, rate * model.apparentViscosity(rate), 1e-14 * stress, model + " at " + rate);
			assertTrue(stress >= model.yieldStress(), model + " at " + rate);
		});
	}

	@Test
	void viscosityStaysBetweenThePlateaus() {
		random.each(MODELS_PER_KIND).forEach(model -> {
			double viscosity = model.apparentViscosity(random.between(1e-9, 1e9));
			switch (model) {
				case Cross(double zero, double infinite, double t, double n) -> assertBetween(infinite, viscosity, zero);
				case Carreau(double zero, double infinite, double t, double n) -> assertBetween(infinite, viscosity, zero);
				default -> assertTrue(viscosity > 0, model.toString());
			}
		});
	}

	@ParameterizedTest
	@ValueSource(doubles = { 0, -0.0, -1, Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY })
	void shearRateMustBeFiniteAndPositive(double rate) {
		random.each(1).forEach(model -> {
			assertNamesRate(rate, () -> model.stress(rate));
			assertNamesRate(rate, () -> model.apparentViscosity(rate));
			assertNamesRate(rate, () -> model.flowIndex(rate));
		});
	}

	@ParameterizedTest
	@MethodSource("oneOfEachKind")
	void kindAndValuesGiveTheModelBack(FluidModel model) {
		ModelKind kind = ModelKind.byId(model.id()).orElseThrow();
		assertEquals(model, kind.create(ModelKind.values(model)));
	}

	static Stream<FluidModel> oneOfEachKind() {
		return new RandomModels(7).each(1);
	}

	private static void assertNamesRate(double rate, Runnable use) {
		IllegalArgumentException refusal = assertThrows(IllegalArgumentException.class, use::run);
		assertEquals("shear rate = " + rate + " 1/s: must be a finite number greater than 0", refusal.getMessage());
	}

	private static void assertBetween(double low, double value, double high) {
		assertTrue(low <= value && value <= high * (1 + 1e-15), low + " <= " + value + " <= " + high);
	}
}
