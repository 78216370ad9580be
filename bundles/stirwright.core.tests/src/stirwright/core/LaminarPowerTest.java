package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import stirwright.correlation.Correlation;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;
import stirwright.rheology.Newtonian;

/** The laminar power constant that a shear-rate constant may read: here ks is a quarter of it. */
class LaminarPowerTest {
    private static final Correlation KS = Invented.formula(
            Invented.anywhere(Quantity.SHEAR_RATE_CONSTANT, "ks.quarter", Variable.LAMINAR_POWER).constant("a", 0.25),
            "{a} Kp", (g, k) -> p -> k.get("a") * p.get(Variable.LAMINAR_POWER));
    private static final Correlation TURBULENT = Invented.formula(
            Invented.correlation(Quantity.POWER_NUMBER, "np.turbulent").atLeast(Measure.REYNOLDS, 100).constant("a", 5),
            "{a}", (g, k) -> p -> k.get("a"));

    private static Correlation laminar(String id, double constant, Transcription grade) {
        return Invented.correlation(Quantity.POWER_NUMBER, id).transcription(grade).atMost(Measure.REYNOLDS, 10)
                .overReynolds("a", constant).build();
    }

    /** A fluid so thin that the case itself is turbulent. */
    private static CaseResult check(Choices choices, Correlation... powers) {
        Correlation[] all = Arrays.copyOf(powers, powers.length + 2);
        all[powers.length] = TURBULENT;
        all[powers.length + 1] = KS;
        return new CrossCheck(Invented.catalogue(all)).check(Invented.water(choices));
    }

    private static double constant(CaseResult result) {
        return result.pick().orElseThrow().state().orElseThrow().shearRateConstant();
    }

    private static Choices chosen(String id) {
        return new Choices(Map.of(Quantity.POWER_NUMBER, id), Map.of());
    }

    @Test
    void isThatOfTheFirstThatQualifiesInLaminarFlowWhateverTheCase() {
        CaseResult result = check(Choices.NONE, laminar("np.sure", 80, Transcription.CHECKED_AGAINST_SOURCE),
                laminar("np.remembered", 100, Transcription.FROM_MEMORY));
        assertEquals("invented.np.turbulent", result.pick().orElseThrow().correlation());
        assertEquals(20, constant(result), 1e-12);
    }

    @Test
    void isThatOfTheChosenOneIfItHoldsThere() {
        Correlation sure = laminar("np.sure", 80, Transcription.CHECKED_AGAINST_SOURCE);
        Correlation unsure = laminar("np.unsure", 100, Transcription.UNSURE);
        assertEquals(25, constant(check(chosen("invented.np.unsure"), sure, unsure)), 1e-12);
        assertEquals(20, constant(check(chosen("invented.np.turbulent"), sure, unsure)), 1e-12);
    }

    @Test
    void isNotKnownWhereNothingQualifies() {
        Correlation ten = Invented.constant(Quantity.SHEAR_RATE_CONSTANT, "ks.ten", 10);
        CaseResult result = new CrossCheck(Invented.catalogue(
                laminar("np.unsure", 80, Transcription.UNSURE), TURBULENT, KS, ten)).check(Invented.water(Choices.NONE));
        QuantityResult quarter = result.quantities().stream()
                .filter(q -> q.id().equals("invented.ks.quarter")).findFirst().orElseThrow();
        assertEquals(Role.EXCLUDED, quarter.role());
        assertTrue(quarter.why().contains("laminar power constant"), quarter.why());
        assertEquals(10, constant(result), 0);
    }

    /** One that fails there alone costs its candidate nothing at the case. */
    @Test
    void codeThatFailsInLaminarFlowKeepsItsCandidate() {
        Correlation fails = Invented.formula(
                Invented.anywhere(Quantity.POWER_NUMBER, "np.fails", Variable.REYNOLDS).scatter(0.01).constant("a", 6), "{a}",
                (g, k) -> p -> {
                    if (p.reynolds() < 10) {
                        throw new IllegalStateException("invented");
                    }
                    return k.get("a");
                });
        CaseResult result = check(Choices.NONE, fails, laminar("np.sure", 80, Transcription.CHECKED_AGAINST_SOURCE));
        assertEquals(20, constant(result), 1e-12);
        assertEquals(6, Invented.row(result, "np.fails").powerNumber(), 0);
    }

    @Test
    void isKnownWhileASpeedIsSolvedForToo() {
        Catalogue catalogue = Invented.catalogue(laminar("np.sure", 80, Transcription.CHECKED_AGAINST_SOURCE), KS);
        for (SpeedDemand demand : List.of(new SpeedDemand.ForShearRate(40), new SpeedDemand.ForPowerPerVolume(100))) {
            CaseResult result = new CrossCheck(catalogue).check(Invented.demand(demand, new Newtonian(1000)));
            FluidState state = result.pick().orElseThrow().state().orElseThrow();
            assertEquals(20, state.shearRateConstant(), 1e-12, demand.toString());
            assertEquals(20 * state.speed(), state.shearRate(), 1e-9 * state.shearRate());
        }
    }
}
