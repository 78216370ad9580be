package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import stirwright.correlation.Correlation;
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
}
