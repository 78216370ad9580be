package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import stirwright.correlation.Correlation;
import stirwright.correlation.Quantity;
import stirwright.correlation.Variable;
import stirwright.rheology.Bingham;
import stirwright.rheology.Fluid;
import stirwright.rheology.FluidModel;
import stirwright.rheology.HerschelBulkley;
import stirwright.rheology.MeasuredWindow;
import stirwright.rheology.PowerLaw;
import stirwright.rheology.YieldBounds;

/** What the bounds of the yield stress do to the pick's power, worked out by hand. */
class YieldEffectTest {
    private static final Correlation KS = Invented.constant(Quantity.SHEAR_RATE_CONSTANT, "ks.ten", 10);
    /** Laminar: Np = 60/Re, so that the power is 60 mu N^2 D^3. */
    private static final Correlation NP = Invented.formula(
            Invented.anywhere(Quantity.POWER_NUMBER, "np.laminar", Variable.REYNOLDS), "60/Re",
            (g, k) -> p -> 60 / p.get(Variable.REYNOLDS));
    private static final Correlation OTHER = Invented.constant(Quantity.POWER_NUMBER, "np.other", 5);

    private static CaseResult check(SpeedDemand demand, FluidModel model, YieldBounds bounds, MeasuredWindow window) {
        return new CrossCheck(Invented.catalogue(KS, NP, OTHER)).check(new CaseSpec("case", Invented.FAMILY, Invented.vessel(),
                demand, new Fluid(model, 1000, window, bounds),
                new Choices(Map.of(Quantity.POWER_NUMBER, "invented.np.laminar"), Map.of()), List.of()));
    }

    private static double byHand(FluidModel model, double speed) {
        return 60 * model.apparentViscosity(10 * speed) * speed * speed * 0.125;
    }

    /** 5 20^0.4 = 16.572 Pa at 20 1/s, so 30 (10 + 16.572)/20 = 39.86 W and 30 (60 + 16.572)/20 = 114.86 W. */
    @Test
    void thePowerWithEachEnd() {
        FluidModel model = new HerschelBulkley(20, 5, 0.4);
        CaseResult result = check(new SpeedDemand.At(2), model, new YieldBounds(10, 60), MeasuredWindow.UNKNOWN);
        CandidateResult pick = result.pick().orElseThrow();
        assertEquals("invented.np.laminar", pick.correlation());
        near(byHand(model, 2), pick.power());
        assertEquals(10, pick.yieldEffect().low());
        assertEquals(60, pick.yieldEffect().high());
        near(byHand(new HerschelBulkley(10, 5, 0.4), 2), pick.yieldEffect().powerLow());
        near(byHand(new HerschelBulkley(60, 5, 0.4), 2), pick.yieldEffect().powerHigh());
        assertTrue(pick.yieldEffect().powerHigh() > 1.5 * pick.power());
        assertTrue(result.notes().stream().anyMatch(n -> n.startsWith("yield stress given as 10 to 60 Pa; with that, at the same"
                + " speed and with the other parameters as they are, the pick's power is 39.86 to 114.9 W")), result.notes().toString());
        CandidateResult other = Invented.row(result, "np.other");
        assertEquals(new YieldEffect(10, 60, Double.NaN, Double.NaN), other.yieldEffect());
    }

    @Test
    void oneEndIsEnough() {
        FluidModel model = new Bingham(20, 1);
        CaseResult result = check(new SpeedDemand.At(2), model, new YieldBounds(Double.NaN, 60), MeasuredWindow.UNKNOWN);
        YieldEffect effect = result.pick().orElseThrow().yieldEffect();
        assertEquals(new YieldEffect(Double.NaN, 60, Double.NaN, effect.powerHigh()), effect);
        near(byHand(new Bingham(60, 1), 2), effect.powerHigh());
        assertTrue(result.notes().stream().anyMatch(n -> n.startsWith("yield stress given as at most 60 Pa")
                && n.contains("power is at most")), result.notes().toString());
    }

    /** 100 W/m3 in pi/4 1.5^3 m3 settle the speed with 20 Pa; with 60 Pa the drive keeps it and needs more. */
    @Test
    void aTargetIsNotMetAnew() {
        FluidModel model = new Bingham(20, 1);
        CaseResult result = check(new SpeedDemand.ForPowerPerVolume(100), model, new YieldBounds(20, 60), MeasuredWindow.UNKNOWN);
        CandidateResult pick = result.pick().orElseThrow();
        double speed = pick.state().orElseThrow().speed();
        near(100 * Math.PI / 4 * 1.5 * 1.5 * 1.5, pick.power());
        near(pick.power(), pick.yieldEffect().powerLow());
        near(byHand(new Bingham(60, 1), speed), pick.yieldEffect().powerHigh());
        assertTrue(pick.yieldEffect().powerHigh() > 1.1 * pick.power());
    }

    @Test
    void withoutBoundsNothingIsSaid() {
        CaseResult result = check(new SpeedDemand.At(2), new Bingham(20, 1), YieldBounds.UNKNOWN, MeasuredWindow.UNKNOWN);
        assertEquals(YieldEffect.NONE, result.pick().orElseThrow().yieldEffect());
        assertFalse(result.notes().stream().anyMatch(n -> n.startsWith("yield stress given")));
    }

    /** 30 W for each Pa s: 10 + 20 = 30 Pa and 200 + 20 = 220 Pa at 20 1/s give 45 and 330 W; 20 + 20 = 40 Pa give 60 W. */
    @Test
    void theStaticYieldStressIsTheHigherEndAndChangesNoRunningPower() {
        YieldBounds bounds = new YieldBounds(10, 25, 200);
        CaseResult result = check(new SpeedDemand.At(2), new Bingham(20, 1), bounds, MeasuredWindow.UNKNOWN);
        CandidateResult pick = result.pick().orElseThrow();
        near(60, pick.power());
        assertEquals(200, pick.yieldEffect().high());
        near(45, pick.yieldEffect().powerLow());
        near(330, pick.yieldEffect().powerHigh());
        assertEquals(List.of("yield stress given as 10 to 200 Pa, the higher end after rest; with that, at the same speed and with"
                + " the other parameters as they are, the pick's power is 45 to 330 W",
                "static yield stress 200 Pa: start-up after rest needs its own check with the drive's maker"), about(result));
        assertEquals(check(new SpeedDemand.At(2), new Bingham(20, 1), new YieldBounds(10, 25), MeasuredWindow.UNKNOWN).status(),
                result.status());
    }

    @Test
    void aGelThatIsBrokenToALiquidHasNoPowerAtItsStaticYieldStress() {
        CaseResult result = check(new SpeedDemand.At(2), new PowerLaw(2, 0.5), new YieldBounds(Double.NaN, Double.NaN, 30),
                MeasuredWindow.UNKNOWN);
        assertEquals(new YieldEffect(Double.NaN, 30, Double.NaN, Double.NaN), result.pick().orElseThrow().yieldEffect());
        assertEquals(List.of("static yield stress 30 Pa: start-up after rest needs its own check with the drive's maker"), about(result));
    }

    @Test
    void aStaticYieldStressBelowTheModelsIsDoubted() {
        CaseResult result = check(new SpeedDemand.At(2), new Bingham(20, 1), new YieldBounds(Double.NaN, Double.NaN, 5),
                MeasuredWindow.UNKNOWN);
        assertEquals(YieldEffect.NONE, result.pick().orElseThrow().yieldEffect());
        assertEquals(List.of("static yield stress 5 Pa, which is below the model's 20 Pa, so check both: start-up after rest needs"
                + " its own check with the drive's maker"), about(result));
    }

    /** Without the caution that every fluid with a yield stress has. */
    private static List<String> about(CaseResult result) {
        return result.notes().stream().filter(n -> !n.startsWith("yield stress: ") && n.contains("yield stress")).toList();
    }

    private static void near(double expected, double actual) {
        assertEquals(expected, actual, 1e-10 * expected);
    }
}
