package stirwright.rheology;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.IntStream;

import org.junit.jupiter.api.Test;

/** Which model is recommended and what is said against it, for curves whose nature is known. */
class RankedFitsTest {

	private static double[] rates(double from, double to, int points) {
		return IntStream.range(0, points).mapToDouble(i -> from * Math.pow(to / from, i / (points - 1.0))).toArray();
	}

	/** With normal errors of 1 %, always the same ones. */
	private static FlowCurve noisy(DoubleUnaryOperator stress, double[] rates) {
		Random random = new Random(7);
		return FlowCurve.of(rates, Arrays.stream(rates).map(r -> stress.applyAsDouble(r) * (1 + 0.01 * random.nextGaussian())).toArray());
	}

	private static RankedFits ranked(FlowCurve curve) {
		return RankedFits.of(curve, FitOptions.DEFAULT);
	}

	@Test
	void eachModelIsRecommendedForItsOwnCurve() {
		double[] wide = rates(1e-3, 1e4, 50);
		for (FluidModel model : List.of(new Newtonian(0.4), new PowerLaw(8, 0.4), new Bingham(6, 0.08),
				new HerschelBulkley(6, 3, 0.5), new Casson(6, 0.08), new Sisko(0.05, 8, 0.3), new Cross(20, 0.02, 2, 0.3),
				new Carreau(20, 0.02, 2, 0.4))) {
			RankedFits fits = ranked(noisy(model::stress, wide));
			assertEquals(ModelKind.of(model), fits.recommended().orElseThrow().kind(), fits.reason());
			assertTrue(fits.attempts().get(0).deltaAicc() <= 2, fits.reason());
		}
	}

	@Test
	void theCriterionByHand() {
		// N = 5 points, 1 and 0.81 relative deviations by hand: newtonian of viscosity 1 on stresses = rates except two
		// stresses 1.1 and 0.9 times the rate; S = (0.1/1.1)^2 + (0.1/0.9)^2 for viscosity 1, least at a viscosity beside it
		double[] rates = { 1, 2, 4, 8, 16 };
		double[] stresses = { 1, 2.2, 4, 7.2, 16 };
		double weightedRates = 0;
		double weightedSquares = 0;
		for (int i = 0; i < 5; i++) {
			weightedRates += rates[i] / stresses[i];
			weightedSquares += rates[i] / stresses[i] * rates[i] / stresses[i];
		}
		double viscosity = weightedRates / weightedSquares;
		double sum = 0;
		for (int i = 0; i < 5; i++) {
			sum += Math.pow(viscosity * rates[i] / stresses[i] - 1, 2);
		}
		// k = 2: 5 ln(S/5) + 4 + 12/2
		ModelFit fit = Fits.one(ModelKind.NEWTONIAN, FlowCurve.of(rates, stresses), FitOptions.DEFAULT);
		assertEquals(viscosity, fit.estimate("viscosity").value(), 1e-12);
		assertEquals(5 * Math.log(sum / 5) + 4 + 6, fit.aicc(), 1e-9);
	}

	@Test
	void aPlateauOutsideTheDataIsSaidAndNotRecommended() {
		// the bend of this Carreau fluid lies three decades below the lowest rate: a power law within the data
		RankedFits fits = ranked(noisy(new Carreau(1e3, 0, 1e3, 0.4)::stress, rates(1, 1000, 30)));
		assertEquals(ModelKind.POWER_LAW, fits.recommended().orElseThrow().kind());
		ModelFit carreau = fits.attempt(ModelKind.CARREAU).fit().orElseThrow();
		assertFalse(carreau.determined());
		assertTrue(carreau.warnings().stream().anyMatch(w -> w.contains("zero-shear plateau lies below")), carreau.warnings()::toString);
		assertTrue(carreau.warnings().stream().anyMatch(w -> w.startsWith("not given by these points: zero-shear viscosity")),
				carreau.warnings()::toString);
	}

	@Test
	void aYieldStressThatIsNotThereIsSaid() {
		RankedFits fits = ranked(noisy(new PowerLaw(8, 0.4)::stress, rates(0.1, 1000, 21)));
		ModelFit fit = fits.attempt(ModelKind.HERSCHEL_BULKLEY).fit().orElseThrow();
		assertEquals(0, fit.estimate("yield_stress").interval().low());
		assertTrue(fit.estimate("yield_stress").interval().high() > 0);
		assertTrue(fit.warnings().contains("the yield stress is not told apart from 0 by these points"));
	}

	@Test
	void fewPointsAndLessThanADecade() {
		RankedFits fits = ranked(FlowCurve.of(new double[] { 1, 2, 3, 5 }, new double[] { 4, 5.5, 6.6, 8.4 }));
		List<String> warnings = fits.recommended().orElseThrow().warnings();
		assertTrue(warnings.contains("only 4 points; at least 6 are wanted"), warnings::toString);
		assertTrue(warnings.contains("the shear rates span less than one decade"), warnings::toString);
		assertTrue(fits.recommended().orElseThrow().doubtful());
		RankedFits.Attempt four = fits.attempt(ModelKind.CROSS);
		four.fit().ifPresent(fit -> assertTrue(fit.estimates().stream().noneMatch(e -> e.interval().known()), "no interval of four from four"));
		assertTrue(Double.isNaN(four.deltaAicc()));
	}

	@Test
	void aFallingCurveIsDescribedByNone() {
		RankedFits fits = ranked(noisy(rate -> 9 * Math.pow(rate, -0.25), rates(1, 1000, 21)));
		ModelFit first = fits.recommended().orElseThrow();
		assertTrue(first.doubtful(), "no model falls: " + first);
		assertTrue(first.warnings().stream().anyMatch(w -> w.startsWith("misses the points by ")), first.warnings()::toString);
		assertTrue(fits.attempt(ModelKind.POWER_LAW).notes().get(0).startsWith("does not describe this curve: the best flow_index = -"));
		assertFalse(ranked(noisy(rate -> 9 * rate, rates(1, 1000, 21))).recommended().orElseThrow().doubtful());
	}

	@Test
	void residualsThatFollowATrendAreSaid() {
		RankedFits fits = ranked(noisy(new HerschelBulkley(6, 3, 0.5)::stress, rates(0.1, 1000, 30)));
		List<String> newtonian = fits.attempt(ModelKind.NEWTONIAN).notes();
		assertTrue(newtonian.stream().anyMatch(w -> w.startsWith("the residuals follow a trend")), newtonian::toString);
		List<String> own = fits.attempt(ModelKind.HERSCHEL_BULKLEY).notes();
		assertTrue(own.stream().noneMatch(w -> w.startsWith("the residuals follow a trend")), own::toString);
	}

	@Test
	void aRobustFitIsNotPulledByOutliers() {
		FluidModel truth = new HerschelBulkley(6, 3, 0.5);
		double[] rates = rates(0.1, 1000, 25);
		double[] stresses = noisy(truth::stress, rates).stresses();
		stresses[4] *= 3;
		stresses[17] /= 4;
		FlowCurve curve = FlowCurve.of(rates, stresses);
		RankedFits robust = RankedFits.of(curve, new FitOptions(Objective.RELATIVE, true));
		ModelFit fit = robust.recommended().orElseThrow();
		assertEquals(ModelKind.HERSCHEL_BULKLEY, fit.kind());
		assertEquals(6, fit.estimate("yield_stress").value(), 0.3);
		assertEquals(3, fit.estimate("consistency").value(), 0.3);
		assertEquals(0.5, fit.estimate("flow_index").value(), 0.02);
		assertTrue(fit.weights()[4] < 0.1 && fit.weights()[17] < 0.1, Arrays.toString(fit.weights()));
		assertTrue(fit.estimate("yield_stress").interval().contains(6), fit.estimate("yield_stress")::toString);
		ModelFit plain = ranked(curve).attempt(ModelKind.HERSCHEL_BULKLEY).fit().orElseThrow();
		assertTrue(Math.abs(plain.estimate("yield_stress").value() - 6) > 1, "the outliers pull: " + plain);
	}
}
