package stirwright.rheology;

import static org.junit.jupiter.api.Assertions.assertDoesNotThrow;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.util.stream.Stream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Each hard limit is met from outside, and the refusal names parameter, value and range. */
class ParameterLimitsTest {

	private static final double NAN = Double.NaN;
	private static final double INFINITY = Double.POSITIVE_INFINITY;
	private static final String POSITIVE = "must be a finite number greater than 0";
	private static final String NOT_NEGATIVE = "must be a finite number, 0 or greater";
	private static final String INDEX = "must be greater than 0 and at most 2";
	private static final String THINNING_INDEX = "must be greater than 0 and at most 1 for a model with a plateau";

	@ParameterizedTest(name = "{0} = {1}")
	@MethodSource
	void refused(String parameter, double value, String allowed, Executable construction) {
		ParameterException refusal = assertThrows(ParameterException.class, construction);
		assertEquals(parameter, refusal.parameter());
		assertEquals(value, refusal.value());
		assertEquals(allowed, refusal.allowed());
		assertEquals(parameter + " = " + value + ": " + allowed, refusal.getMessage());
	}

	static Stream<Arguments> refused() {
		return Stream.of(
				refusal("viscosity", 0, POSITIVE, () -> new Newtonian(0)),
				refusal("viscosity", -1, POSITIVE, () -> new Newtonian(-1)),
				refusal("viscosity", INFINITY, POSITIVE, () -> new Newtonian(INFINITY)),
				refusal("consistency", 0, POSITIVE, () -> new PowerLaw(0, 0.5)),
				refusal("consistency", NAN, POSITIVE, () -> new PowerLaw(NAN, 0.5)),
				refusal("flow_index", 0, INDEX, () -> new PowerLaw(1, 0)),
				refusal("flow_index", 2.001, INDEX, () -> new PowerLaw(1, 2.001)),
				refusal("flow_index", NAN, INDEX, () -> new PowerLaw(1, NAN)),
				refusal("yield_stress", -0.1, NOT_NEGATIVE, () -> new Bingham(-0.1, 1)),
				refusal("yield_stress", INFINITY, NOT_NEGATIVE, () -> new Bingham(INFINITY, 1)),
				refusal("plastic_viscosity", 0, POSITIVE, () -> new Bingham(1, 0)),
				refusal("yield_stress", NAN, NOT_NEGATIVE, () -> new HerschelBulkley(NAN, 1, 0.5)),
				refusal("consistency", -3, POSITIVE, () -> new HerschelBulkley(1, -3, 0.5)),
				refusal("flow_index", -0.5, INDEX, () -> new HerschelBulkley(1, 1, -0.5)),
				refusal("yield_stress", -1, NOT_NEGATIVE, () -> new Casson(-1, 1)),
				refusal("plastic_viscosity", NAN, POSITIVE, () -> new Casson(1, NAN)),
				refusal("infinite_shear_viscosity", -1, NOT_NEGATIVE, () -> new Sisko(-1, 1, 0.5)),
				refusal("consistency", 0, POSITIVE, () -> new Sisko(1, 0, 0.5)),
				refusal("flow_index", 1.1, THINNING_INDEX, () -> new Sisko(1, 1, 1.1)),
				refusal("zero_shear_viscosity", 0, POSITIVE, () -> new Cross(0, 0, 1, 0.5)),
				refusal("infinite_shear_viscosity", 3, mustNotExceed(2), () -> new Cross(2, 3, 1, 0.5)),
				refusal("infinite_shear_viscosity", -1, mustNotExceed(2), () -> new Cross(2, -1, 1, 0.5)),
				refusal("time_constant", -1, NOT_NEGATIVE, () -> new Cross(2, 1, -1, 0.5)),
				refusal("flow_index", 1.1, THINNING_INDEX, () -> new Cross(2, 1, 1, 1.1)),
				refusal("zero_shear_viscosity", INFINITY, POSITIVE, () -> new Carreau(INFINITY, 0, 1, 0.5)),
				refusal("infinite_shear_viscosity", NAN, mustNotExceed(2), () -> new Carreau(2, NAN, 1, 0.5)),
				refusal("time_constant", NAN, NOT_NEGATIVE, () -> new Carreau(2, 1, NAN, 0.5)),
				refusal("flow_index", 0, THINNING_INDEX, () -> new Carreau(2, 1, 1, 0)));
	}

	@Test
	void theLimitsThemselvesAreAllowed() {
		assertDoesNotThrow(() -> new PowerLaw(Double.MIN_VALUE, 2));
		assertDoesNotThrow(() -> new HerschelBulkley(0, 1, 2));
		assertDoesNotThrow(() -> new Cross(2, 2, 0, 1));
		assertDoesNotThrow(() -> new Carreau(2, 0, 0, Double.MIN_VALUE));
	}

	private static String mustNotExceed(double zeroShear) {
		return "must be from 0 to the zero-shear viscosity, which is " + zeroShear;
	}

	private static Arguments refusal(String parameter, double value, String allowed, Executable construction) {
		return arguments(parameter, value, allowed, construction);
	}
}
