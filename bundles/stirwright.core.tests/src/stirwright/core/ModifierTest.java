package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
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

    @Test
    void whatRestsOnADoubtfulFactorIsNotRecommended() {
        CaseResult result = new CrossCheck(Invented.catalogue(KS, SINGLE, TOTAL, several("np.worse", 7, Transcription.UNSURE)))
                .check(threeImpellers());
        CandidateResult row = Invented.row(result, "np.single");
        assertEquals(5 * (1 + 7 * 2), row.powerNumber(), 1e-12, "it is shown");
        assertEquals(Role.EXCLUDED, row.role());
        assertTrue(row.why().contains("invented.np.worse") && row.why().contains("unsure"), row.why());
        assertEquals("invented.np.total", result.pick().orElseThrow().correlation());
    }

    @Test
    void aFactorThatContainsAnotherEffectReplacesItsFactor() {
        Correlation both = factor("np.both", Effect.SEVERAL_IMPELLERS, 3).contains(Effect.CLEARANCE).build();
        Correlation clearance = factor("np.clearance", Effect.CLEARANCE, 10).build();
        CaseResult result = new CrossCheck(Invented.catalogue(KS, SINGLE, both, clearance)).check(threeImpellers());
        assertEquals(15, Invented.row(result, "np.single").powerNumber(), 1e-12);
    }

    @Test
    void aFactorMadeForTheFamilyGoesBeforeOneForAny() {
        Correlation any = factor("np.any", Effect.CLEARANCE, 10).scatter(0.01).build();
        Correlation own = factor("np.own", Effect.CLEARANCE, 2).notStated(Measure.D_OVER_T, "unknown").build();
        CaseResult result = new CrossCheck(Invented.catalogue(KS, SINGLE, any, own)).check(threeImpellers());
        assertEquals(5 * 2, Invented.row(result, "np.single").powerNumber(), 1e-12);
    }

    private static CorrelationBuilder factor(String id, Effect effect, double value) {
        CorrelationBuilder builder = Correlation.modifier("invented." + id, Quantity.POWER_NUMBER, effect, id)
                .cite(Invented.SOURCE).transcription(Transcription.FROM_MEMORY).value("a", value);
        return id.equals("np.any") ? builder.anyFamily() : builder.families(Invented.FAMILY);
    }

    private static CaseSpec threeImpellers() {
        Map<String, Double> vessel = Invented.vessel();
        vessel.put("impeller_count", 3.0);
        vessel.put("impeller_spacing", 0.6);
        vessel.put("liquid_height", 3.0);
        return new CaseSpec("case", Invented.FAMILY, vessel, new SpeedDemand.At(2),
                Invented.fluid(new Newtonian(0.001)), Choices.NONE, List.of());
    }
}
