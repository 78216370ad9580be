package stirwright.rheology;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The names are a contract: they are written out here as the case table has them. */
class ModelKindTest {

	@ParameterizedTest
	@CsvSource({
			"newtonian, viscosity_Pa_s",
			"power-law, consistency_Pa_sn flow_index",
			"bingham, yield_stress_Pa plastic_viscosity_Pa_s",
			"herschel-bulkley, yield_stress_Pa consistency_Pa_sn flow_index",
			"casson, yield_stress_Pa plastic_viscosity_Pa_s",
			"sisko, infinite_shear_viscosity_Pa_s consistency_Pa_sn flow_index",
			"cross, zero_shear_viscosity_Pa_s infinite_shear_viscosity_Pa_s time_constant_s flow_index",
			"carreau, zero_shear_viscosity_Pa_s infinite_shear_viscosity_Pa_s time_constant_s flow_index" })
	void columns(String id, String columns) {
		ModelKind kind = ModelKind.byId(id).orElseThrow();
		assertEquals(List.of(columns.split(" ")), kind.parameters().stream().map(Parameter::column).toList());
	}

	@Test
	void everyKindOfTheContractAndSisko() {
		assertEquals(
				List.of("newtonian", "power-law", "bingham", "herschel-bulkley", "casson", "sisko", "cross", "carreau"),
				Arrays.stream(ModelKind.values()).map(ModelKind::id).toList());
	}

	@Test
	void namesAreColumnsWithoutUnits() {
		assertEquals(List.of("yield_stress", "consistency", "flow_index"),
				ModelKind.HERSCHEL_BULKLEY.parameters().stream().map(Parameter::name).toList());
		assertEquals(List.of("Pa", "Pa s^n", "-"),
				ModelKind.HERSCHEL_BULKLEY.parameters().stream().map(Parameter::unit).toList());
	}

	@Test
	void valuesGoInAndComeOutInTheOrderOfTheParameters() {
		assertEquals(new Carreau(8, 2, 3, 0.5), ModelKind.CARREAU.create(8, 2, 3, 0.5));
		assertArrayEquals(new double[] { 8, 2, 3, 0.5 }, ModelKind.values(new Carreau(8, 2, 3, 0.5)));
		assertEquals(ModelKind.CARREAU, ModelKind.of(new Carreau(8, 2, 3, 0.5)));
	}

	@Test
	void unknownIdIsEmpty() {
		assertTrue(ModelKind.byId("Newtonian").isEmpty());
		assertTrue(ModelKind.byId("").isEmpty());
	}

	@Test
	void wrongNumberOfValues() {
		IllegalArgumentException refusal =
				assertThrows(IllegalArgumentException.class, () -> ModelKind.BINGHAM.create(1));
		assertEquals("bingham takes 2 values (yield_stress, plastic_viscosity), not 1", refusal.getMessage());
	}
}
