package stirwright.rheology;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.function.Consumer;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** What must hold for the fit of any curve, seen on random noisy ones. */
class FitPropertiesTest {

	private static final int CURVES = 200;

	@Test
	void residualsByHand() {
		// stress = rate against 1, 4, 2 at rates 1, 2, 4: deviations 0, -2, 2 Pa, or 0, -1/2, 1 of the measured stress
		FlowCurve curve = FlowCurve.of(new double[] { 1, 2, 4 }, new double[] { 1, 4, 2 });
		FluidModel model = new Newtonian(1);
		assertEquals(new Fit(model, Objective.ABSOLUTE, 8, Math.sqrt(1.25 / 3), 3),
				Fit.of(model, curve, Objective.ABSOLUTE));
		assertEquals(new Fit(model, Objective.RELATIVE, 1.25, Math.sqrt(1.25 / 3), 3),
				Fit.of(model, curve, Objective.RELATIVE));
	}

	@ParameterizedTest
	@EnumSource
	void herschelBulkleyIsNeverWorseThanPowerLaw(Objective objective) {
		forNoisyCurves(curve -> {
			Fit powerLaw = Fits.powerLaw(curve, objective);
			Fit herschelBulkley = Fits.herschelBulkley(curve, objective);
			assertTrue(herschelBulkley.residualSumOfSquares() <= powerLaw.residualSumOfSquares(),
					herschelBulkley + " against " + powerLaw);
		});
	}

	@Test
	void relativeFitIsNeverWorseThanTheLogLogLine() {
		forNoisyCurves(curve -> assertTrue(Fits.powerLaw(curve, Objective.RELATIVE).residualSumOfSquares()
				<= Fits.powerLawLogLog(curve).residualSumOfSquares()));
	}

	@ParameterizedTest
	@EnumSource
	void noNeighbourFitsBetter(Objective objective) {
		forNoisyCurves(curve -> {
			assertNoNeighbourBetter(Fits.powerLaw(curve, objective), curve);
			assertNoNeighbourBetter(Fits.herschelBulkley(curve, objective), curve);
		});
	}

	@ParameterizedTest
	@EnumSource
	void unitsOfStressAndRateOnlyScaleTheParameters(Objective objective) {
		// stress in mPa and rate in 1/h: ty * 1000, and K * 1000 / 3600^n
		forNoisyCurves(curve -> {
			FlowCurve scaled = FlowCurve.of(
					DoubleStream.of(curve.shearRates()).map(rate -> 3600 * rate).toArray(),
					DoubleStream.of(curve.stresses()).map(stress -> 1000 * stress).toArray());
			double[] expected = ModelKind.values(Fits.herschelBulkley(curve, objective).model());
			double[] actual = ModelKind.values(Fits.herschelBulkley(scaled, objective).model());
			double lowest = Arrays.stream(curve.stresses()).min().orElseThrow();
			assertEquals(expected[0], actual[0] / 1000, 1e-6 * lowest);
			assertEquals(expected[1], actual[1] / 1000 * Math.pow(3600, actual[2]), 1e-6 * expected[1]);
			assertEquals(expected[2], actual[2], 1e-6);
		});
	}

	/** Moves each parameter a little up and down, a yield stress of 0 up alone: at a minimum, no residual falls. */
	private static void assertNoNeighbourBetter(Fit fit, FlowCurve curve) {
		double[] best = ModelKind.values(fit.model());
		for (int i = 0; i < best.length; i++) {
			for (double factor : new double[] { 0.999, 1.001 }) {
				double[] moved = best.clone();
				moved[i] = best[i] == 0 ? 1e-3 * curve.stress(0) : factor * best[i];
				FluidModel neighbour = ModelKind.of(fit.model()).create(moved);
				assertTrue(fit.residualSumOfSquares() <= Fit.of(neighbour, curve, fit.objective()).residualSumOfSquares(),
						neighbour + " is better than " + fit);
			}
		}
	}

	private static void forNoisyCurves(Consumer<FlowCurve> assertion) {
		RandomModels random = new RandomModels(5);
		for (int i = 0; i < CURVES; i++) {
			FluidModel model = new HerschelBulkley(
					random.between(1e-3, 10), random.between(0.5, 5), random.between(0.3, 1.2));
			double[] rates = IntStream.range(0, 13).mapToDouble(k -> Math.pow(10, k / 4.0 - 1)).toArray();
			double[] stresses = Arrays.stream(rates).map(rate -> model.stress(rate) * random.noise(0.03)).toArray();
			assertion.accept(FlowCurve.of(rates, stresses));
		}
	}
}
