package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.rheology.Newtonian;

/** A factor whose effect the case leaves out is not applied, and is named with what it would have been. */
class EffectsLeftOutTest {
    private static final Correlation KS = Invented.constant(Quantity.SHEAR_RATE_CONSTANT, "ks.ten", 10);
    private static final Correlation NP = Invented.constant(Quantity.POWER_NUMBER, "np.single", 5);
    private static final Correlation CONTAINING = Invented.constant(
            Quantity.POWER_NUMBER, "np.total", 7, b -> b.contains(Effect.SEVERAL_IMPELLERS, Effect.LIQUID_DEPTH));
    private static final Correlation NQ = Invented.constant(Quantity.FLOW_NUMBER, "nq.plain", 0.5);
    private static final Correlation SEVERAL = factor("np.several", Quantity.POWER_NUMBER, Effect.SEVERAL_IMPELLERS, 1.5)
            .appliesWhen("several", g -> g.get(Dimensions.IMPELLER_COUNT) > 1).build();
    private static final Correlation DEEP = factor("np.deep", Quantity.POWER_NUMBER, Effect.LIQUID_DEPTH, 1.2).build();
    private static final Correlation FLOW = factor("nq.several", Quantity.FLOW_NUMBER, Effect.SEVERAL_IMPELLERS, 3).build();

    private static CorrelationBuilder factor(String id, Quantity quantity, Effect effect, double value) {
        return Correlation.modifier("invented." + id, quantity, effect, id).families(Invented.FAMILY).cite(Invented.SOURCE)
                .transcription(Transcription.FROM_MEMORY).value("a", value);
    }

    private static CaseResult check(String... leftOut) {
        return check(List.of(KS, NP, CONTAINING, NQ, SEVERAL, DEEP, FLOW), leftOut);
    }

    private static CaseResult check(List<Correlation> installed, String... leftOut) {
        return new CrossCheck(Invented.catalogue(installed.toArray(Correlation[]::new))).check(spec(leftOut));
    }

    private static CaseSpec spec(String... leftOut) {
        Map<String, Double> vessel = Invented.vessel();
        vessel.put("impeller_count", 2.0);
        return new CaseSpec("case", Invented.FAMILY, vessel, new SpeedDemand.At(2), Invented.fluid(new Newtonian(0.001)),
                new Choices(Map.of(), Map.of(), Set.of(leftOut), Map.of()), List.of());
    }

    @Test
    void theOthersStayAndTheTotalLacksTheFactor() {
        assertEquals(5 * 1.5 * 1.2, Invented.row(check(), "np.single").powerNumber(), 1e-12);
        CandidateResult row = Invented.row(check("several-impellers"), "np.single");
        assertEquals(5 * 1.2, row.powerNumber(), 1e-12);
        assertEquals(0.5, row.flowNumber(), 1e-12, "the effect is left out of every quantity");
        assertEquals(5 * 1.5, Invented.row(check("liquid-depth"), "np.single").powerNumber(), 1e-12);
        assertEquals(5, Invented.row(check("liquid-depth", "several-impellers"), "np.single").powerNumber(), 1e-12);
    }

    @Test
    void theRowSaysWhatWouldHaveBeenApplied() {
        List<String> notes = Invented.row(check("several-impellers"), "np.single").notes();
        assertTrue(notes.stream().anyMatch(n -> n.contains("several impellers") && n.contains("as the case says")
                && n.contains("times 1.5 by invented.np.several")), notes.toString());
        assertTrue(notes.stream().anyMatch(n -> n.contains("times 3 by invented.nq.several")), notes.toString());
        assertTrue(notes.stream().anyMatch(n -> n.startsWith("liquid depth: power number times 1.2 by")), notes.toString());
    }

    @Test
    void aFactorThatThePickLacksFlagsTheCase() {
        assertEquals(Status.OK, check().status(), check().flags().toString());
        CaseResult result = check("several-impellers");
        assertEquals(Status.FLAGGED, result.status());
        assertTrue(result.flags().toString().contains("several impellers on the shaft: the power number lacks a factor of 1.5"), result.flags().toString());
        assertTrue(result.flags().toString().contains("the flow number lacks a factor of 3"), result.flags().toString());
    }

    @Test
    void aFactorOfOneOrOnWhatNothingRestsOnFlagsNothing() {
        Correlation one = factor("np.one", Quantity.POWER_NUMBER, Effect.CLEARANCE, 1).build();
        Correlation idle = factor("ks.idle", Quantity.SHEAR_RATE_CONSTANT, Effect.CLEARANCE, 2).build();
        CaseResult result = check(List.of(KS, NP, one, idle), "clearance");
        assertEquals(Status.OK, result.status(), result.flags().toString());
        assertEquals(2, Invented.row(result, "np.single").notes().size(), "the row names both all the same");
    }

    @Test
    void whatContainsTheEffectKeepsItAndSaysSo() {
        CaseResult result = check(List.of(KS, CONTAINING, SEVERAL), "several-impellers");
        assertEquals(7, result.pick().orElseThrow().powerNumber());
        assertTrue(result.notes().stream().anyMatch(n -> n.contains("effects_left_out several-impellers")
                && n.contains("invented.np.total itself")), result.notes().toString());
    }

    @Test
    void whereNothingAppliesThatIsSaid() {
        CaseResult result = check(List.of(KS, NP, DEEP), "liquid-depth");
        assertFalse(result.notes().stream().anyMatch(n -> n.contains("effects_left_out")), result.notes().toString());
        Correlation never = factor("np.never", Quantity.POWER_NUMBER, Effect.FROUDE, 9).appliesWhen("never", g -> false).build();
        result = check(List.of(KS, NP, never), "froude");
        assertTrue(result.notes().stream().anyMatch(n -> n.contains("effects_left_out froude") && n.contains("nothing is left out")),
                result.notes().toString());
    }

    @Test
    void anUnknownEffectIsRefusedWithThoseThatThereAre() {
        Refusal refusal = check("several-impellers", "wobble").refusal().orElseThrow();
        assertEquals("effects_left_out", refusal.field());
        assertTrue(refusal.reason().contains("'wobble'") && refusal.reason().contains("liquid-depth, several-impellers"),
                refusal.reason());
    }

    @Test
    void aFactorThatFailsCanBeDoneWithout() {
        Correlation broken = Correlation.modifier("invented.np.broken", Quantity.POWER_NUMBER, Effect.CLEARANCE, "broken")
                .families(Invented.FAMILY).cite(Invented.SOURCE).transcription(Transcription.FROM_MEMORY)
                .formula("fails").relation((g, k) -> {
                    throw new IllegalStateException("broken");
                }).build();
        assertTrue(check(List.of(KS, NP, broken)).refusal().isPresent(), "its candidate is lost with it");
        CaseResult result = check(List.of(KS, NP, broken), "clearance");
        assertEquals(5, result.pick().orElseThrow().powerNumber());
    }

    @Test
    void dimensionsThatAloneTheLeftOutReadsDoNotMatter() {
        Correlation reading = factor("np.reading", Quantity.POWER_NUMBER, Effect.CLEARANCE, 2)
                .appliesWhen("high", g -> g.get(Dimensions.BLADE_WIDTH) > 0).build();
        Map<String, Double> vessel = Invented.vessel();
        vessel.remove("blade_width");
        CaseSpec spec = spec("clearance");
        CaseSpec blank = new CaseSpec("case", Invented.FAMILY, vessel, spec.speed(), spec.fluid(), spec.choices(), List.of());
        CaseSpec applied = new CaseSpec("case", Invented.FAMILY, vessel, spec.speed(), spec.fluid(), Choices.NONE, List.of());
        CrossCheck check = new CrossCheck(Invented.catalogue(KS, NP, reading));
        assertTrue(check.check(applied).flags().toString().contains("blade_width_m"));
        assertFalse(check.check(blank).flags().toString().contains("blade_width_m"));
    }

    @Test
    void anOpenCaseListsTheFactorsOfACandidate() {
        OpenCase open = new CrossCheck(Invented.catalogue(KS, NP, NQ, SEVERAL, DEEP, FLOW)).open(spec("liquid-depth"));
        List<FactorFinding> factors = open.factors(Quantity.POWER_NUMBER, "invented.np.single");
        assertEquals(List.of("invented.np.several", "invented.np.deep"), factors.stream().map(f -> f.factor().id()).toList());
        assertEquals(List.of(false, true), factors.stream().map(FactorFinding::leftOut).toList());
        assertEquals(List.of(1.5, 1.2), factors.stream().map(FactorFinding::value).toList());
        assertEquals(List.of(3.0), open.factors(Quantity.FLOW_NUMBER, "invented.nq.plain").stream()
                .map(FactorFinding::value).toList());
    }
}
