package stirwright.rheology;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

import org.junit.jupiter.api.Test;

/** What several curves of one product say together. */
class RampsAndTemperaturesTest {

	private static final double[] RATES = { 0.1, 0.3, 1, 3, 10, 30, 100, 300 };

	private static FlowCurve curve(FluidModel model) {
		return FlowCurve.of(RATES, Arrays.stream(RATES).map(model::stress).toArray());
	}

	@Test
	void loopByHand() {
		// up 2 + rate against down 1 + rate, straight lines, from 1 to 3: area 1 Pa * 2 1/s; at 1: 3/2, at 3: 5/4
		FlowCurve up = FlowCurve.of(new double[] { 0.5, 1, 2, 3 }, new double[] { 2.5, 3, 4, 5 });
		FlowCurve down = FlowCurve.of(new double[] { 1, 2, 3, 4 }, new double[] { 2, 3, 4, 5 });
		Hysteresis loop = Hysteresis.between(up, down).orElseThrow();
		assertEquals(new MeasuredWindow(1, 3), loop.common());
		assertEquals(2, loop.area(), 1e-12);
		// below the rising line from 1 to 3: 3.5 + 4.5 = 8
		assertEquals(2.0 / 8, loop.relativeArea(), 1e-12);
		assertEquals(1.5, loop.ratioAt(1), 1e-12);
		assertEquals(4.0 / 3, loop.ratioAt(2), 1e-12);
		assertEquals(1.25, loop.ratioAt(3), 1e-12);
		assertTrue(Double.isNaN(loop.ratioAt(0.9)));
		assertTrue(Double.isNaN(loop.ratioAt(3.1)));
	}

	@Test
	void equalRampsHaveNoLoopAndDistantOnesNoComparison() {
		Hysteresis loop = Hysteresis.between(curve(new PowerLaw(3, 0.5)), curve(new PowerLaw(3, 0.5))).orElseThrow();
		assertEquals(0, loop.area(), 1e-12);
		assertEquals(1, loop.ratioAt(17), 1e-12);
		FlowCurve far = FlowCurve.of(new double[] { 1e4, 1e5, 1e6 }, new double[] { 1, 2, 3 });
		assertEquals(Optional.empty(), Hysteresis.between(curve(new Newtonian(1)), far));
	}

	@Test
	void yieldStressOverModelsRampsAndTheVane() {
		Map<String, RankedFits> fits = new LinkedHashMap<>();
		fits.put("up", RankedFits.of(curve(new HerschelBulkley(20, 5, 0.5)), FitOptions.DEFAULT));
		fits.put("down", RankedFits.of(curve(new HerschelBulkley(14, 5, 0.5)), FitOptions.DEFAULT));
		YieldRange dynamic = YieldRange.of(fits, OptionalDouble.empty()).orElseThrow();
		// the models' own values are known; Casson and Bingham differ from them by what they cannot follow
		assertTrue(dynamic.low() <= 14.001 && dynamic.low() > 10, dynamic::toString);
		assertTrue(dynamic.high() >= 19.999 && dynamic.high() < 30, dynamic::toString);
		YieldRange withVane = YieldRange.of(fits, OptionalDouble.of(41)).orElseThrow();
		assertEquals(41, withVane.high());
		assertEquals(dynamic.low(), withVane.low());
		assertTrue(dynamic.sources().stream().anyMatch(s -> s.name().equals("bingham, up") && !s.counted()
				&& s.why().startsWith("misses the curve by")), dynamic::toString);
	}

	@Test
	void aProductWithoutYieldStressHasNoRangeAboveZero() {
		YieldRange range = YieldRange.of(Map.of("", RankedFits.of(curve(new PowerLaw(8, 0.4)), FitOptions.DEFAULT)),
				OptionalDouble.empty()).orElseThrow();
		assertEquals(0, range.low());
		assertTrue(range.high() < 1e-3 * curve(new PowerLaw(8, 0.4)).stress(0), range::toString);
	}

	@Test
	void tenKelvinColder() {
		// exp(E/R (1/303.15 - 1/313.15)) for 20, 40 and 60 kJ/mol: 1.29, 1.66, 2.14, by hand
		double[] energies = { 20e3, 40e3, 60e3 };
		double[] expected = { 1.29, 1.66, 2.14 };
		for (int i = 0; i < energies.length; i++) {
			List<TemperatureLaw.Measured> measured = new ArrayList<>();
			for (double celsius : new double[] { 20, 40, 60 }) {
				double factor = Math.exp(energies[i] / 8.31446261815324 * (1 / (celsius + 273.15) - 1 / 313.15));
				measured.add(new TemperatureLaw.Measured(celsius, curve(new PowerLaw(8 * factor, 0.4))));
			}
			TemperatureLaw law = TemperatureLaw.of(ModelKind.POWER_LAW, measured, FitOptions.DEFAULT).orElseThrow();
			assertEquals(energies[i], law.lines().get(0).activationEnergy(), 1e-4 * energies[i]);
			double ratio = law.at(30).apparentViscosity(5) / law.at(40).apparentViscosity(5);
			assertEquals(expected[i], ratio, 0.005);
			assertEquals(8, ((PowerLaw) law.at(40)).consistency(), 1e-6);
			assertEquals(0.4, ((PowerLaw) law.at(33)).flowIndex(), 1e-9);
			assertTrue(law.lines().get(0).interval().known());
			assertEquals(0, law.worst(), 1e-6);
			assertEquals(0, law.outside(20));
			assertEquals(5, law.outside(15));
			assertEquals(2, law.outside(62));
		}
	}

	@Test
	void oneFlowIndexForAllTemperatures() {
		TemperatureLaw law = TemperatureLaw.of(ModelKind.POWER_LAW, List.of(
				new TemperatureLaw.Measured(20, curve(new PowerLaw(10, 0.42))),
				new TemperatureLaw.Measured(50, curve(new PowerLaw(5, 0.38)))), FitOptions.DEFAULT).orElseThrow();
		assertEquals(0.40, ((PowerLaw) law.at(20)).flowIndex(), 1e-9);
		assertEquals(0.40, ((PowerLaw) law.at(50)).flowIndex(), 1e-9);
		assertFalse(law.lines().get(0).interval().known(), "two temperatures leave nothing to judge by");
		// the common index turns each curve by 0.02 of a decade in a decade; at the ends, 1.5 decades off, by about 8 %
		assertTrue(law.worst() > 0.05 && law.worst() < 0.12, "worst " + law.worst());
		assertTrue(law.rmsRelative() > 0.02 && law.rmsRelative() < law.worst(), "rms " + law.rmsRelative());
	}

	@Test
	void oneTemperatureIsNoLaw() {
		FlowCurve one = curve(new PowerLaw(10, 0.42));
		assertEquals(Optional.empty(), TemperatureLaw.of(ModelKind.POWER_LAW,
				List.of(new TemperatureLaw.Measured(20, one), new TemperatureLaw.Measured(20, one)), FitOptions.DEFAULT));
	}

	@Test
	void pooledCurvesKeepEveryPoint() {
		FlowCurve pooled = FlowCurve.pooled(List.of(curve(new Newtonian(1)), curve(new Newtonian(2))));
		assertEquals(2 * RATES.length, pooled.size());
		assertEquals(RATES.length, pooled.differentShearRates());
	}
}
