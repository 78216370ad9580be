package stirwright.rheology;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

/** Each definition of the case table at a point whose numbers come out by hand. */
class ModelDefinitionTest {

	@Test
	void newtonian() {
		// 0.5 * 20 = 10
		assertPoint(new Newtonian(0.5), 20, 10, 0.5, 1);
	}

	@Test
	void powerLaw() {
		// 3 * 16^0.5 = 3 * 4 = 12; 12 / 16 = 0.75
		assertPoint(new PowerLaw(3, 0.5), 16, 12, 0.75, 0.5);
	}

	@Test
	void powerLawOfTheTextbookProblem() {
		// Geankoplis, Transport Processes and Unit Operations, problem on non-Newtonian agitation (section 3.5, exact
		// locator not at hand): K = 26.49, n = 0.53, shear rate 11 * 5 1/s; apparent viscosity 4.028 Pa s as printed.
		assertEquals(4.028, new PowerLaw(26.49, 0.53).apparentViscosity(55), 5e-4);
	}

	@Test
	void bingham() {
		// 4 + 0.25 * 16 = 8; 8 / 16 = 0.5; d stress / d rate * rate / stress = 0.25 * 16 / 8 = 0.5
		assertPoint(new Bingham(4, 0.25), 16, 8, 0.5, 0.5);
	}

	@Test
	void herschelBulkley() {
		// 4 + 3 * 16^0.5 = 16; 16 / 16 = 1; 0.5 * 12 / 16 = 0.375
		assertPoint(new HerschelBulkley(4, 3, 0.5), 16, 16, 1, 0.375);
	}

	@Test
	void casson() {
		// (sqrt(4) + sqrt(0.25 * 16))^2 = (2 + 2)^2 = 16; 16 / 16 = 1; 2 / (2 + 2) = 0.5
		assertPoint(new Casson(4, 0.25), 16, 16, 1, 0.5);
	}

	@Test
	void sisko() {
		// 0.5 * 16 + 3 * 16^0.5 = 20; 20 / 16 = 1.25; (8 * 1 + 12 * 0.5) / 20 = 0.7
		assertPoint(new Sisko(0.5, 3, 0.5), 16, 20, 1.25, 0.7);
	}

	@Test
	void cross() {
		// (0.25 * 36)^0.5 = 3; 2 + 8 / (1 + 3) = 4; 36 * 4 = 144.
		// d ln(viscosity) / d ln(rate) = -8 * 0.5 * 3 / (1 + 3)^2 / 4 = -0.1875
		assertPoint(new Cross(10, 2, 0.25, 0.5), 36, 144, 4, 0.8125);
	}

	@Test
	void carreau() {
		// (1 + 15)^(-0.25) = 0.5; 2 + 8 * 0.5 = 6; sqrt(15) * 6.
		// d ln(viscosity) / d ln(rate) = 8 * (-0.5) * 0.5 * 15 / 16 / 6 = -0.3125
		assertPoint(new Carreau(10, 2, 1, 0.5), Math.sqrt(15), 6 * Math.sqrt(15), 6, 0.6875);
	}

	private static void assertPoint(FluidModel model, double rate, double stress, double viscosity, double index) {
		assertAll(
				() -> assertEquals(stress, model.stress(rate), 1e-14 * stress, "stress"),
				() -> assertEquals(viscosity, model.apparentViscosity(rate), 1e-14 * viscosity, "viscosity"),
				() -> assertEquals(index, model.flowIndex(rate), 1e-14, "flow index"));
	}
}
