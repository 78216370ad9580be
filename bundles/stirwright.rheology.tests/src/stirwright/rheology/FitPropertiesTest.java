package stirwright.rheology;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Set;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.Consumer;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** What must hold for the fit of any curve, seen on random noisy ones. */
class FitPropertiesTest {

	private static final int CURVES = 200;

	private static ModelFit fit(ModelKind kind, FlowCurve curve, Objective objective) {
		return Fits.one(kind, curve, new FitOptions(objective, false));
	}

	@Test
	void residualsByHand() {
		// stress = rate against 1, 4, 2 at rates 1, 2, 4: deviations 0, -2, 2 Pa, or 0, -1/2, 1 of the measured stress
		FlowCurve curve = FlowCurve.of(new double[] { 1, 2, 4 }, new double[] { 1, 4, 2 });
		FluidModel model = new Newtonian(1);
		assertEquals(8, Objective.ABSOLUTE.residualSumOfSquares(model, curve));
		assertEquals(1.25, Objective.RELATIVE.residualSumOfSquares(model, curve));
		// ln 1/2 and ln 2
		assertEquals(2 * Math.log(2) * Math.log(2), Objective.LOGARITHMIC.residualSumOfSquares(model, curve), 1e-15);
		// sqrt 2 - 2 and 2 - sqrt 2
		assertEquals(2 * Math.pow(2 - Math.sqrt(2), 2), Objective.SQUARE_ROOT.residualSumOfSquares(model, curve), 1e-15);
	}

	@ParameterizedTest
	@EnumSource
	void noModelIsWorseThanOneThatItContains(Objective objective) {
		forNoisyCurves(curve -> {
			double powerLaw = fit(ModelKind.POWER_LAW, curve, objective).residualSumOfSquares();
			double newtonian = fit(ModelKind.NEWTONIAN, curve, objective).residualSumOfSquares();
			double bingham = fit(ModelKind.BINGHAM, curve, objective).residualSumOfSquares();
			ModelFit herschelBulkley = fit(ModelKind.HERSCHEL_BULKLEY, curve, objective);
			assertTrue(herschelBulkley.residualSumOfSquares() <= powerLaw, herschelBulkley + " against " + powerLaw);
			assertTrue(herschelBulkley.residualSumOfSquares() <= bingham * (1 + 1e-9), herschelBulkley + " against " + bingham);
			if (fit(ModelKind.POWER_LAW, curve, objective).estimate("flow_index").value() < 0.8) {
				// a power law is what both become as the time constant grows
				for (ModelKind kind : List.of(ModelKind.CROSS, ModelKind.CARREAU)) {
					double plateaus = fit(kind, curve, objective).residualSumOfSquares();
					assertTrue(plateaus <= powerLaw * 1.001, kind + ": " + plateaus + " against " + powerLaw);
				}
			}
			assertTrue(powerLaw <= newtonian * (1 + 1e-9), powerLaw + " against " + newtonian);
			assertTrue(bingham <= newtonian * (1 + 1e-9), bingham + " against " + newtonian);
		});
	}

	@Test
	void relativeFitIsNeverWorseThanTheLogLogLine() {
		forNoisyCurves(curve -> assertTrue(fit(ModelKind.POWER_LAW, curve, Objective.RELATIVE).residualSumOfSquares()
				<= Objective.RELATIVE.residualSumOfSquares(fit(ModelKind.POWER_LAW, curve, Objective.LOGARITHMIC).model(), curve)));
	}

	@ParameterizedTest
	@EnumSource
	void noNeighbourFitsBetter(Objective objective) {
		AtomicInteger compared = new AtomicInteger();
		forNoisyCurves(curve -> {
			for (ModelKind kind : ModelKind.values()) {
				try {
					ModelFit fit = fit(kind, curve, objective);
					// where the points do not give a parameter the sum falls on without end
					if (fit.determined()) {
						assertNoNeighbourBetter(fit, curve);
						compared.incrementAndGet();
					}
				} catch (ParameterException | IllegalArgumentException beyond) {
					// a thickening curve has no model with a plateau
					assertTrue(Set.of(ModelKind.SISKO, ModelKind.CROSS, ModelKind.CARREAU).contains(kind), beyond::getMessage);
				}
			}
		});
		assertTrue(compared.get() > 4 * CURVES, "compared " + compared);
	}

	@ParameterizedTest
	@EnumSource
	void unitsOfStressAndRateOnlyScaleTheParameters(Objective objective) {
		// stress in mPa and rate in 1/h: ty * 1000, and K * 1000 / 3600^n
		forNoisyCurves(curve -> {
			FlowCurve scaled = FlowCurve.of(
					DoubleStream.of(curve.shearRates()).map(rate -> 3600 * rate).toArray(),
					DoubleStream.of(curve.stresses()).map(stress -> 1000 * stress).toArray());
			double[] expected = ModelKind.values(fit(ModelKind.HERSCHEL_BULKLEY, curve, objective).model());
			double[] actual = ModelKind.values(fit(ModelKind.HERSCHEL_BULKLEY, scaled, objective).model());
			double lowest = Arrays.stream(curve.stresses()).min().orElseThrow();
			assertEquals(expected[0], actual[0] / 1000, 1e-6 * lowest);
			assertEquals(expected[1], actual[1] / 1000 * Math.pow(3600, actual[2]), 1e-6 * expected[1]);
			assertEquals(expected[2], actual[2], 1e-6);
		});
	}

	/** Moves each parameter a little up and down as far as the model allows, one of 0 up alone: no residual falls. */
	private static void assertNoNeighbourBetter(ModelFit fit, FlowCurve curve) {
		double[] best = ModelKind.values(fit.model());
		double sum = fit.residualSumOfSquares();
		for (int i = 0; i < best.length; i++) {
			for (double factor : new double[] { 0.999, 1.001 }) {
				double[] moved = best.clone();
				moved[i] = best[i] == 0 ? 1e-3 * curve.stress(0) / curve.shearRate(0) : factor * best[i];
				FluidModel neighbour;
				try {
					neighbour = fit.kind().create(moved);
				} catch (ParameterException outside) {
					continue;
				}
				// where a parameter does not matter, a neighbour is as good but for rounding
				assertTrue(sum <= fit.options().objective().residualSumOfSquares(neighbour, curve) * (1 + 1e-6),
						neighbour + " is better than " + fit);
			}
		}
	}

	@Test
	void aBoundIsLookedAtByAllOfManyPoints() {
		// the yield stress is a third of the lowest viscous stress; some of the points lead the way, all must settle it
		RandomModels random = new RandomModels(12);
		FluidModel truth = new HerschelBulkley(0.1, 3, 0.5);
		double[] rates = IntStream.range(0, 20_000).mapToDouble(i -> Math.pow(10, -2 + 5 * i / 19_999.0)).toArray();
		FlowCurve curve = FlowCurve.of(rates, Arrays.stream(rates).map(r -> truth.stress(r) * random.noise(0.03)).toArray());
		ModelFit fit = fit(ModelKind.HERSCHEL_BULKLEY, curve, Objective.RELATIVE);
		assertTrue(fit.residualSumOfSquares() <= Objective.RELATIVE.residualSumOfSquares(truth, curve), fit::toString);
		assertTrue(fit.estimate("yield_stress").interval().contains(0.1), fit.estimate("yield_stress")::toString);
		assertTrue(fit.estimate("yield_stress").interval().low() > 0, fit.estimate("yield_stress")::toString);
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
