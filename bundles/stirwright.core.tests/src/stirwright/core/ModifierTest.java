package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.rheology.Newtonian;

/** A modifier is applied exactly where its effect is active and not contained already. */
class ModifierTest {
    private static final Correlation KS = Invented.constant(Quantity.SHEAR_RATE_CONSTANT, "ks.ten", 10);
    private static final Correlation SINGLE = Invented.constant(Quantity.POWER_NUMBER, "np.single", 5);
    private static final Correlation TOTAL = Invented.constant(
            Quantity.POWER_NUMBER, "np.total", 9, b -> b.contains(Effect.SEVERAL_IMPELLERS));

    private static Correlation several(String id, double each, Transcription grade) {
        return Correlation.modifier("invented." + id, Quantity.POWER_NUMBER, Effect.SEVERAL_IMPELLERS, "several")
                .families(Invented.FAMILY).cite(Invented.SOURCE).transcription(grade)
                .range(Measure.S_OVER_D, 1, 3).constant("a", each)
                .appliesWhen("several impellers", g -> g.get(Dimensions.IMPELLER_COUNT) > 1)
                .formula("1 + {a} (ni - 1)")
                .relation((g, k) -> p -> 1 + k.get("a") * (g.get(Dimensions.IMPELLER_COUNT) - 1)).build();
    }

    private static CaseResult check(double impellers, double spacing) {
        Map<String, Double> vessel = Invented.vessel();
        vessel.put("impeller_count", impellers);
        vessel.put("impeller_spacing", spacing);
        vessel.put("liquid_height", 3.0);
        return new CrossCheck(Invented.catalogue(KS, SINGLE, TOTAL,
                        several("np.factor", 0.8, Transcription.FROM_MEMORY),
                        several("np.worse", 7, Transcription.UNSURE)))
                .check(new CaseSpec("case", Invented.FAMILY, vessel, new SpeedDemand.At(2),
                        Invented.fluid(new Newtonian(0.001)), Choices.NONE, List.of()));
    }

    @Test
    void oneImpellerNeedsNone() {
        assertEquals(5, Invented.row(check(1, 0.5), "np.single").powerNumber());
    }

    @Test
    void theMostTrustedOfTwoIsAppliedOnceAndNamed() {
        CandidateResult row = Invented.row(check(3, 0.6), "np.single");
        assertEquals(5 * (1 + 0.8 * 2), row.powerNumber(), 1e-12);
        assertEquals(1, row.notes().size());
        assertTrue(row.notes().get(0).contains("times 2.6 by invented.np.factor"), row.notes().toString());
    }

    @Test
    void neverAppliedToWhatContainsTheEffect() {
        CandidateResult row = Invented.row(check(3, 0.6), "np.total");
        assertEquals(9, row.powerNumber());
        assertTrue(row.notes().isEmpty());
    }

    @Test
    void boundOfAModifierCountsForTheCandidate() {
        CandidateResult row = Invented.row(check(3, 0.2), "np.single");
        assertEquals(Role.EXCLUDED, row.role());
        assertTrue(row.failedBounds().get(0).contains("S/D 0.4 is outside (invented.np.factor: 1 to 3)"), row.failedBounds().toString());
        assertEquals(Role.RECOMMENDED, Invented.row(check(3, 0.2), "np.total").role());
    }
}
