package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import stirwright.correlation.Correlation;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Variable;
import stirwright.rheology.Newtonian;
import stirwright.rheology.PowerLaw;

/** A blank speed and a target: each candidate solves for its own speed. */
class SpeedDemandTest {
    private static final Correlation KS = Invented.constant(Quantity.SHEAR_RATE_CONSTANT, "ks.ten", 10);
    private static final Correlation FIVE = Invented.constant(Quantity.POWER_NUMBER, "np.five", 5);
    private static final Correlation FORTY = Invented.constant(Quantity.POWER_NUMBER, "np.forty", 40);

    @Test
    void shearRateTargetGivesTheSpeedByHand() {
        CaseResult result = new CrossCheck(Invented.catalogue(KS, FIVE))
                .check(Invented.demand(new SpeedDemand.ForShearRate(25), new PowerLaw(8, 0.5)));
        FluidState s = result.pick().orElseThrow().state().orElseThrow();
        assertEquals(2.5, s.speed(), 1e-12);
        assertEquals(25, s.shearRate(), 1e-12);
    }

    @Test
    void tipSpeedTargetGivesTheSpeedByHand() {
        CaseResult result = new CrossCheck(Invented.catalogue(KS, FIVE))
                .check(Invented.demand(new SpeedDemand.ForTipSpeed(3), new Newtonian(1)));
        assertEquals(3 / (Math.PI * 0.5), result.pick().orElseThrow().state().orElseThrow().speed(), 1e-15);
    }

    @Test
    void powerPerVolumeTargetIsMetByEachCandidateAtItsOwnSpeed() {
        CaseResult result = new CrossCheck(Invented.catalogue(KS, FIVE, FORTY))
                .check(Invented.demand(new SpeedDemand.ForPowerPerVolume(250), new Newtonian(1)));
        double volume = Math.PI / 4 * 1.5 * 1.5 * 1.5;
        for (CandidateResult row : result.candidates()) {
            double np = row.correlation().endsWith("five") ? 5 : 40;
            // P/V = Np rho N^3 D^5/V
            double speed = Math.cbrt(250 * volume / (np * 1000 * Math.pow(0.5, 5)));
            assertEquals(speed, row.state().orElseThrow().speed(), 1e-10, row.correlation());
            assertEquals(250, row.powerPerVolume(), 1e-7, row.correlation());
        }
        assertEquals(2, result.candidates().size());
    }

    /** Shear rate ks N with ks falling as Re^-2 first rises, then falls: two speeds meet the target. */
    @Test
    void ofSeveralSpeedsTheLeastIsTaken() {
        Correlation humped = Invented.formula(
                Invented.anywhere(Quantity.SHEAR_RATE_CONSTANT, "ks.humped", Variable.REYNOLDS)
                        .constant("a", 10).constant("b", 250),
                "{a}/(1 + (Re/{b})^2)", (g, k) -> p -> k.get("a") / (1 + Math.pow(p.reynolds() / k.get("b"), 2)));
        // Newtonian, mu = 1: Re = 250 N, so ks N = 10 N/(1 + N^2) = 4 at N = 0.5 and N = 2.
        CaseResult result = new CrossCheck(Invented.catalogue(humped, FIVE))
                .check(Invented.demand(new SpeedDemand.ForShearRate(4), new Newtonian(1)));
        assertEquals(0.5, result.pick().orElseThrow().state().orElseThrow().speed(), 1e-10);
        CaseResult outOfReach = new CrossCheck(Invented.catalogue(humped, FIVE))
                .check(Invented.demand(new SpeedDemand.ForShearRate(6), new Newtonian(1)));
        assertEquals(Status.REFUSED, outOfReach.status(), "the greatest is 5 at N = 1");
        assertEquals("target_shear_rate_1_s", outOfReach.refusal().orElseThrow().field());
        assertTrue(outOfReach.refusal().orElseThrow().words().contains("no speed"));
    }

    /** At the speed that meets the target this constant allows three shear rates; only the demanded one counts. */
    @ParameterizedTest
    @ValueSource(doubles = {5, 20, 50, 400})
    void aTargetIsMetWhereTheSpeedAloneWouldAllowOtherShearRates(double target) {
        Correlation steep = Invented.formula(
                Invented.anywhere(Quantity.SHEAR_RATE_CONSTANT, "ks.steep", Variable.REYNOLDS)
                        .constant("a", 2).constant("b", 48).constant("c", 300),
                "{a} + {b}/(1 + ({c}/Re)^6)",
                (g, k) -> p -> k.get("a") + k.get("b") / (1 + Math.pow(k.get("c") / p.reynolds(), 6)));
        CaseResult result = new CrossCheck(Invented.catalogue(steep, FIVE))
                .check(Invented.demand(new SpeedDemand.ForShearRate(target), new PowerLaw(8, 0.3)));
        FluidState s = result.pick().orElseThrow().state().orElseThrow();
        assertEquals(target, s.shearRate(), 1e-9 * target);
        assertEquals(2 + 48 / (1 + Math.pow(300 / s.reynolds(), 6)), s.shearRateConstant(), 1e-6 * s.shearRateConstant());
    }

    /** 60 m/s at D = 0.5 m is 38.2 rev/s, so with ks = 10 nothing above 382 1/s can be met. */
    @Test
    void speedsBeyondTheTipSpeedLimitAreNoSolution() {
        for (SpeedDemand demand : List.of(new SpeedDemand.ForShearRate(400), new SpeedDemand.ForPowerPerVolume(1e9),
                new SpeedDemand.At(90), new SpeedDemand.ForTipSpeed(61))) {
            CaseResult result = new CrossCheck(Invented.catalogue(KS, FIVE)).check(Invented.demand(demand, new Newtonian(1)));
            assertEquals(Status.REFUSED, result.status(), demand.toString());
            assertEquals(demand.field(), result.refusal().orElseThrow().field());
            assertTrue(result.refusal().orElseThrow().words().contains("60 m/s"), result.refusal().orElseThrow().words());
        }
    }

    @Test
    void aPowerNumberThatReadsTheFlowNumberMeetsATargetToo() {
        Correlation flow = Invented.constant(Quantity.FLOW_NUMBER, "nq.half", 0.5);
        Correlation power = Invented.formula(
                Invented.anywhere(Quantity.POWER_NUMBER, "np.flow", Variable.FLOW_NUMBER).constant("a", 10),
                "{a} Nq", (g, k) -> p -> k.get("a") * p.get(Variable.FLOW_NUMBER));
        CaseResult result = new CrossCheck(Invented.catalogue(KS, flow, power))
                .check(Invented.demand(new SpeedDemand.ForPowerPerVolume(250), new Newtonian(1)));
        assertEquals(5, result.pick().orElseThrow().powerNumber(), 1e-12);
        assertEquals(250, result.pick().orElseThrow().powerPerVolume(), 1e-7);
    }

    /** ks = 10 at D = 0.5 m: 1e-4 rev/s is 1e-3 1/s and 1.6e-4 m/s. */
    @Test
    void speedsBelowTheLeastAreNoSolution() {
        for (SpeedDemand demand : List.of(new SpeedDemand.ForShearRate(0.9e-3), new SpeedDemand.ForTipSpeed(1.5e-4),
                new SpeedDemand.At(0.9e-4))) {
            CaseResult result = new CrossCheck(Invented.catalogue(KS, FIVE)).check(Invented.demand(demand, new Newtonian(1)));
            assertEquals(Status.REFUSED, result.status(), demand.toString());
            assertEquals(demand.field(), result.refusal().orElseThrow().field());
            assertTrue(result.refusal().orElseThrow().words().contains("0.0001 rev/s"), result.refusal().orElseThrow().words());
        }
    }

    /** The one made for baffles cannot meet the target; the other one must not stand in for it. */
    @Test
    void oneMadeForAnotherKindOfVesselDoesNotStandIn() {
        Correlation falling = Invented.formula(
                Invented.correlation(Quantity.POWER_NUMBER, "np.falling", Variable.REYNOLDS).range(Measure.REYNOLDS, 1, 1e9)
                        .oneOf(Measure.BLADE_COUNT, 6).constant("a", 1e-9),
                "{a}", (g, k) -> p -> k.get("a"));
        Correlation three = Invented.constant(Quantity.POWER_NUMBER, "np.three", 5, b -> b.oneOf(Measure.BLADE_COUNT, 3));
        CaseResult result = new CrossCheck(Invented.catalogue(KS, falling, three))
                .check(Invented.demand(new SpeedDemand.ForPowerPerVolume(250), new Newtonian(1)));
        assertEquals("target_power_per_volume_W_m3", result.refusal().orElseThrow().field());
        CaseResult alone = new CrossCheck(Invented.catalogue(KS, three))
                .check(Invented.demand(new SpeedDemand.ForPowerPerVolume(250), new Newtonian(1)));
        assertEquals(Status.FLAGGED, alone.status(), "named as the nearest when there is no other");
    }
}
