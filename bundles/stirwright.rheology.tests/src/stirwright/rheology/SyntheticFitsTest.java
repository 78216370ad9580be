package stirwright.rheology;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Curves made from known parameters give them back; curves that no parameters describe are refused. */
class SyntheticFitsTest {

	/** 0.1 to 1000 1/s, five points a decade. */
	private static final double[] RATES = IntStream.rangeClosed(-5, 15).mapToDouble(i -> Math.pow(10, i / 5.0)).toArray();

	private static ModelFit fit(ModelKind kind, FlowCurve curve, Objective objective) {
		return Fits.one(kind, curve, new FitOptions(objective, false));
	}

	@ParameterizedTest
	@EnumSource
	void herschelBulkleyIsRecovered(Objective objective) {
		RandomModels random = new RandomModels(99);
		for (int i = 0; i < 200; i++) {
			double[] known = { random.between(0.1, 100), random.between(0.1, 20), random.between(0.15, 1.6) };
			FluidModel model = ModelKind.HERSCHEL_BULKLEY.create(known);
			assertParameters(known, fit(ModelKind.HERSCHEL_BULKLEY, curve(model), objective));
		}
	}

	@ParameterizedTest
	@EnumSource
	void powerLawIsRecovered(Objective objective) {
		RandomModels random = new RandomModels(98);
		for (int i = 0; i < 200; i++) {
			double[] known = { random.between(1e-3, 1e3), random.between(0.02, 2) };
			FluidModel model = ModelKind.POWER_LAW.create(known);
			assertParameters(known, fit(ModelKind.POWER_LAW, curve(model), objective));
			assertParameters(known, fit(ModelKind.POWER_LAW, curve(model), Objective.LOGARITHMIC));
		}
	}

	@ParameterizedTest
	@EnumSource
	void binghamIsHerschelBulkleyWithFlowIndexOne(Objective objective) {
		assertParameters(new double[] { 8, 0.2, 1 }, fit(ModelKind.HERSCHEL_BULKLEY, curve(new Bingham(8, 0.2)), objective));
	}

	@ParameterizedTest
	@EnumSource
	void yieldStressStopsAtZeroWhereTheDataWantItNegative(Objective objective) {
		double[] stresses = DoubleStream.of(RATES).map(rate -> 10 * Math.sqrt(rate) - 2).toArray();
		FlowCurve curve = FlowCurve.of(RATES, stresses);
		ModelFit fit = fit(ModelKind.HERSCHEL_BULKLEY, curve, objective);
		ModelFit powerLaw = fit(ModelKind.POWER_LAW, curve, objective);
		assertEquals(0, fit.model().yieldStress());
		double residual = powerLaw.residualSumOfSquares();
		assertEquals(residual, fit.residualSumOfSquares(), 1e-12 * residual);
	}

	@Test
	void fallingStressHasNoPowerLaw() {
		FlowCurve falling = curveOf(rate -> 5 * Math.pow(rate, -0.25));
		assertRefused("flow_index", -0.25, () -> fit(ModelKind.POWER_LAW, falling, Objective.LOGARITHMIC));
		assertRefused("flow_index", -0.25, () -> fit(ModelKind.POWER_LAW, falling, Objective.RELATIVE));
		assertRefused("flow_index", -0.25, () -> fit(ModelKind.HERSCHEL_BULKLEY, falling, Objective.RELATIVE));
	}

	@Test
	void consistencyIsNeverNegative() {
		// a straight fall would be met exactly by a yield stress of 2000 Pa and a consistency of -1 Pa s
		FlowCurve falling = curveOf(rate -> 2000 - rate);
		ParameterException refusal = assertThrows(ParameterException.class,
				() -> fit(ModelKind.HERSCHEL_BULKLEY, falling, Objective.ABSOLUTE));
		assertEquals("flow_index", refusal.parameter());
		assertTrue(refusal.value() < 0, refusal.getMessage());
	}

	@Test
	void steepStressIsBeyondTheFlowIndex() {
		FlowCurve steep = curveOf(rate -> 5 * Math.pow(rate, 2.5));
		assertRefused("flow_index", 2.5, () -> fit(ModelKind.POWER_LAW, steep, Objective.ABSOLUTE));
		assertRefused("flow_index", 2.5, () -> fit(ModelKind.HERSCHEL_BULKLEY, steep, Objective.ABSOLUTE));
	}

	@Test
	void tooFewDifferentRates() {
		FlowCurve oneRate = FlowCurve.of(new double[] { 5, 5, 5 }, new double[] { 1, 2, 3 });
		assertNeeds(2, 1, () -> fit(ModelKind.POWER_LAW, oneRate, Objective.LOGARITHMIC));
		assertNeeds(2, 1, () -> fit(ModelKind.POWER_LAW, oneRate, Objective.RELATIVE));
		FlowCurve twoRates = FlowCurve.of(new double[] { 5, 5, 6 }, new double[] { 1, 2, 3 });
		assertNeeds(3, 2, () -> fit(ModelKind.HERSCHEL_BULKLEY, twoRates, Objective.RELATIVE));
	}

	private static FlowCurve curve(FluidModel model) {
		return curveOf(model::stress);
	}

	private static FlowCurve curveOf(DoubleUnaryOperator stress) {
		return FlowCurve.of(RATES, DoubleStream.of(RATES).map(stress).toArray());
	}

	private static void assertParameters(double[] known, ModelFit fit) {
		double[] ratios = ModelKind.values(fit.model());
		double[] ones = new double[known.length];
		for (int i = 0; i < known.length; i++) {
			ratios[i] /= known[i];
			ones[i] = 1;
		}
		assertArrayEquals(ones, ratios, 1e-6, () -> fit + " against " + Arrays.toString(known));
		assertEquals(0, fit.rmsRelative(), 1e-6);
	}

	private static void assertRefused(String parameter, double value, Runnable fit) {
		ParameterException refusal = assertThrows(ParameterException.class, fit::run);
		assertEquals(parameter, refusal.parameter());
		assertEquals(value, refusal.value(), 1e-6);
	}

	private static void assertNeeds(int needed, int found, Runnable fit) {
		IllegalArgumentException refusal = assertThrows(IllegalArgumentException.class, fit::run);
		assertEquals("the fit needs at least " + needed + " different shear rates, the curve has " + found,
				refusal.getMessage());
	}
}
