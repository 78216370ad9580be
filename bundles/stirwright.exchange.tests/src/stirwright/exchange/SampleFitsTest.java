package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import stirwright.rheology.FitOptions;
import stirwright.rheology.FlowCurve;
import stirwright.rheology.FluidModel;
import stirwright.rheology.HerschelBulkley;
import stirwright.rheology.ModelKind;
import stirwright.rheology.PowerLaw;
import stirwright.rheology.YieldRange;

/** What several curves of a sample say together; all invented, computed from known parameters. */
class SampleFitsTest {
    private static final double[] RATES = {0.1, 0.5, 1, 5, 10, 50, 100};

    private static CurveFits curve(String sample, Ramp ramp, int replicate, double celsius, FluidModel model) {
        FlowCurve points = FlowCurve.of(RATES, Arrays.stream(RATES).map(model::stress).toArray());
        Measurement from = new Measurement("invented.txt", "", "", sample, ramp, replicate, celsius, List.of(), List.of());
        return CurveFits.of(new MeasuredCurve(sample + " " + ramp.word() + " " + replicate + " " + celsius, points, from), FitOptions.DEFAULT);
    }

    private static List<SampleFits> samples(CurveFits... curves) {
        return SampleFits.of(List.of(curves), FitOptions.DEFAULT, OptionalDouble.empty());
    }

    @Test
    void curvesOfDifferentSamplesAreNeverPooled() {
        List<SampleFits> samples = samples(curve("A", Ramp.UP, 1, 25, new PowerLaw(8, 0.4)), curve("B", Ramp.UP, 1, 25, new PowerLaw(9, 0.4)));
        assertEquals(List.of("invented.txt A", "invented.txt B"), samples.stream().map(SampleFits::name).toList());
        assertTrue(samples.stream().allMatch(s -> s.temperatures().get(0).pooled().isEmpty() && s.temperatures().get(0).loop().isEmpty()));
    }

    @Test
    void replicatesOfOneRampArePooledAndRampsNever() {
        SampleFits sample = samples(
                curve("", Ramp.UP, 1, 25, new PowerLaw(8.2, 0.4)), curve("", Ramp.UP, 2, 25.4, new PowerLaw(7.8, 0.4)),
                curve("", Ramp.DOWN, 1, 25, new PowerLaw(4, 0.4))).get(0);
        assertEquals("invented.txt", sample.name());
        SampleFits.AtTemperature at = sample.temperatures().get(0);
        assertEquals(1, at.pooled().size());
        CurveFits pooled = at.pooled().get(0);
        assertEquals(2 * RATES.length, pooled.curve().points().size());
        // two power laws of one index, by their relative deviations: K = (1/8.2 + 1/7.8) / (1/8.2^2 + 1/7.8^2)
        double expected = (1 / 8.2 + 1 / 7.8) / (1 / (8.2 * 8.2) + 1 / (7.8 * 7.8));
        assertEquals(expected, pooled.fits().attempt(ModelKind.POWER_LAW).fit().orElseThrow().estimate("consistency").value(), 1e-6);
        // up over down: the geometric mean of 8.2 and 7.8 over 4
        assertEquals(Math.sqrt(8.2 * 7.8) / 4, at.loop().orElseThrow().ratioAt(3), 1e-9);
    }

    @Test
    void theYieldStressSpansRampsAndTheVane() {
        CurveFits[] curves = {curve("", Ramp.UP, 1, 25, new HerschelBulkley(20, 5, 0.5)), curve("", Ramp.DOWN, 1, 25, new HerschelBulkley(14, 5, 0.5))};
        YieldRange range = samples(curves).get(0).temperatures().get(0).yieldStress().orElseThrow();
        assertTrue(range.low() <= 14.001 && range.high() >= 19.999 && range.high() < 41, range::toString);
        assertEquals(41, SampleFits.of(List.of(curves), FitOptions.DEFAULT, OptionalDouble.of(41)).get(0).temperatures().get(0)
                .yieldStress().orElseThrow().high());
    }

    @Test
    void aColdYieldStressSaysNothingOfAWarmOne() {
        SampleFits sample = samples(curve("", Ramp.UP, 1, 10, new HerschelBulkley(60, 5, 0.5)), curve("", Ramp.UP, 1, 50, new HerschelBulkley(14, 5, 0.5))).get(0);
        assertEquals(List.of(10.0, 50.0), sample.temperatures().stream().map(SampleFits.AtTemperature::celsius).toList());
        assertTrue(sample.temperatures().get(1).yieldStress().orElseThrow().high() < 30);
        assertTrue(sample.temperatures().get(0).yieldStress().orElseThrow().low() > 30);
    }

    @Test
    void severalTemperaturesMakeALaw() {
        CurveFits[] curves = Stream.of(20.0, 40.0, 60.0).map(celsius -> curve("", Ramp.UP, 1, celsius,
                new PowerLaw(8 * Math.exp(40e3 / 8.31446261815324 * (1 / (celsius + 273.15) - 1 / 313.15)), 0.4))).toArray(CurveFits[]::new);
        SampleFits sample = samples(curves).get(0);
        assertEquals(40e3, sample.law().orElseThrow().lines().get(0).activationEnergy(), 4);
        assertTrue(sample.temperatures().stream().allMatch(t -> t.pooled().isEmpty()), "curves of different temperatures are no replicates");
        assertTrue(samples(curves[0]).get(0).law().isEmpty());
    }

    private static CurveFits from(String source, List<String> warnings, double celsius, FluidModel model) {
        FlowCurve points = FlowCurve.of(RATES, Arrays.stream(RATES).map(model::stress).toArray());
        return CurveFits.of(new MeasuredCurve(source, points,
                new Measurement(source, "0f", "", "", Ramp.UP, 1, celsius, List.of(), warnings)), FitOptions.DEFAULT);
    }

    @Test
    void theSamePointsCountOnce() {
        CurveFits one = from("a.csv", List.of(), 25, new PowerLaw(8, 0.4));
        SampleFits.AtTemperature twice = samples(one, one).get(0).temperatures().get(0);
        assertEquals(List.of(), twice.pooled(), "a file that is read twice is no replicate of itself");
        CurveFits pooled = samples(one, one, from("a.csv", List.of(), 25, new PowerLaw(9, 0.4))).get(0).temperatures().get(0).pooled().get(0);
        assertEquals(2 * RATES.length, pooled.curve().points().size());
        assertTrue(pooled.curve().measurement().warnings().toString().contains("same points"), pooled.curve().measurement().toString());
    }

    @Test
    void aPoolKeepsTheWarningsOfItsParts() {
        CurveFits pooled = samples(from("a.csv", List.of(), 25, new PowerLaw(8, 0.4)),
                from("a.csv", List.of("the temperature drifts"), 25, new PowerLaw(9, 0.4))).get(0).temperatures().get(0).pooled().get(0);
        assertTrue(pooled.curve().measurement().warnings().toString().contains("the temperature drifts"));
        assertEquals(stirwright.core.Status.FLAGGED, pooled.status());
    }

    @Test
    void filesNamedByTheirTemperatureAreOneSample() {
        List<SampleFits> warm = samples(from("paste_T20.csv", List.of(), 20, new PowerLaw(8, 0.4)), from("paste_T60.csv", List.of(), 60, new PowerLaw(4, 0.4)));
        assertEquals(1, warm.size());
        assertTrue(warm.get(0).law().isPresent());
        assertEquals(1, samples(from("paste 20C.csv", List.of(), 20, new PowerLaw(8, 0.4)), from("paste 60C.csv", List.of(), 60, new PowerLaw(4, 0.4))).size());
        assertEquals(2, samples(from("paste_T20.csv", List.of(), 25, new PowerLaw(8, 0.4)), from("paste_T60.csv", List.of(), 25, new PowerLaw(4, 0.4))).size(),
                "a T may be a sample's letter");
        assertEquals(2, samples(from("paste 20C.csv", List.of(), 20, new PowerLaw(8, 0.4)), from("cream 20C.csv", List.of(), 20, new PowerLaw(4, 0.4))).size());
        CurveFits other = from("paste 20C.csv", List.of(), 20, new PowerLaw(4, 0.4));
        Measurement there = other.curve().measurement();
        CurveFits elsewhere = new CurveFits(new MeasuredCurve("b", other.curve().points(), new Measurement(there.source(), "1e", "", "",
                Ramp.UP, 1, 20, List.of(), List.of())), other.fits());
        assertEquals(2, samples(from("paste 20C.csv", List.of(), 20, new PowerLaw(8, 0.4)), elsewhere).size(), "two files of one name in two folders");
    }
}
