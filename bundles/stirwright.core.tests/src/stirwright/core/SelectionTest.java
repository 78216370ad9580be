package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.UnaryOperator;
import org.junit.jupiter.api.Test;
import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.FlowKind;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Standing;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;
import stirwright.correlation.Verdict;

/** Qualification and recommendation as the contract page fixes them. Re is 5e5 in these cases. */
class SelectionTest {
    private static final Correlation KS = Invented.constant(Quantity.SHEAR_RATE_CONSTANT, "ks.ten", 10);

    private static Correlation np(String id, double value, UnaryOperator<CorrelationBuilder> change) {
        return Invented.constant(Quantity.POWER_NUMBER, id, value, change);
    }

    private static CaseResult check(Choices choices, Correlation... powers) {
        List<Correlation> all = new ArrayList<>(List.of(powers));
        all.add(KS);
        return new CrossCheck(Invented.catalogue(all.toArray(Correlation[]::new))).check(Invented.water(choices));
    }

    private static List<String> order(Correlation... powers) {
        return Invented.ids(check(Choices.NONE, powers));
    }

    @Test
    void approvedInHouseComesBeforeEverything() {
        assertEquals(List.of("np.b", "np.a"), order(np("np.a", 5, b -> b.scatter(0.01)),
                np("np.b", 5, b -> b.standing(Standing.APPROVED).transcription(Transcription.FROM_MEMORY)
                        .notStated(Measure.D_OVER_T, "unknown"))));
    }

    @Test
    void fewerBoundsNotStatedComeBeforeBetterTranscription() {
        assertEquals(List.of("np.b", "np.a"), order(
                np("np.a", 5, b -> b.notStated(Measure.D_OVER_T, "unknown")),
                np("np.b", 5, b -> b.transcription(Transcription.FROM_MEMORY))));
    }

    @Test
    void betterTranscriptionComesBeforeScatterAndScatterBeforeId() {
        assertEquals(List.of("np.d", "np.c", "np.b", "np.a", "np.e"), order(
                np("np.e", 5, b -> b.transcription(Transcription.CHECKED_NUMERICALLY).scatter(0.01)),
                np("np.a", 5, b -> b),
                np("np.b", 5, b -> b.scatter(0.2)),
                np("np.c", 5, b -> b.scatter(0.1)),
                np("np.d", 5, b -> b.scatter(0.05))).stream().toList());
        assertEquals(List.of("np.a", "np.b"), order(np("np.b", 5, b -> b), np("np.a", 5, b -> b)));
    }

    @Test
    void whatMayNotBeRecommendedIsExcludedWithItsReason() {
        CaseResult result = check(Choices.NONE, np("np.good", 5, b -> b),
                np("np.unsure", 5, b -> b.transcription(Transcription.UNSURE)),
                np("np.draft", 5, b -> b.standing(Standing.IN_HOUSE_DRAFT)),
                np("np.retired", 5, b -> b.standing(Standing.RETIRED)),
                np("np.practice", 5, b -> b.cite(Citation.commonPractice())),
                np("np.negative", -5, b -> b));
        Map<String, String> reasons = Map.of("np.unsure", "unsure", "np.draft", "draft", "np.retired", "retired",
                "np.practice", "no source", "np.negative", "no positive number");
        reasons.forEach((id, word) -> {
            CandidateResult row = Invented.row(result, id);
            assertEquals(Role.EXCLUDED, row.role(), id);
            assertTrue(row.why().contains(word), row.why());
        });
        assertEquals(Role.RECOMMENDED, result.pick().orElseThrow().role());
        assertEquals(1, result.spread(), "one candidate qualifies");
    }

    @Test
    void sourceMustStateReynoldsRangeAndGeometryClass() {
        Correlation noRange = Invented.correlation(Quantity.POWER_NUMBER, "np.norange")
                .notStated(Measure.REYNOLDS, "unknown").constant("a", 5).formula("{a}")
                .relation((g, k) -> p -> k.get("a")).build();
        Correlation noClass = Correlation.of("invented.np.noclass", Quantity.POWER_NUMBER, "no class")
                .families(Invented.FAMILY).cite(Invented.SOURCE).transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .range(Measure.REYNOLDS, 1, 1e9).notStated(Classifier.BAFFLING, "unknown")
                .constant("a", 5).formula("{a}").relation((g, k) -> p -> k.get("a")).build();
        CaseResult result = check(Choices.NONE, noRange, noClass);
        assertEquals(Role.EXCLUDED, Invented.row(result, "np.norange").role());
        assertEquals(Role.EXCLUDED, Invented.row(result, "np.noclass").role());
        assertEquals(Verdict.NOT_STATED, Invented.row(result, "np.noclass").verdict());
        assertEquals(Status.FLAGGED, result.status());
        assertTrue(result.flags().get(0).startsWith("nothing is recommended"), result.flags().toString());
        assertTrue(Double.isNaN(result.spread()));
    }

    @Test
    void ruleOfTheTradeIsTheNearestOnlyWhereNothingIsPublished() {
        Correlation rule = np("np.practice", 3, b -> b.cite(Citation.commonPractice()));
        Correlation published = np("np.published", 5, b -> b.oneOf(Measure.BLADE_COUNT, 4));
        assertEquals(List.of("np.published", "np.practice"), order(rule, published), "made for 4 blades, the case has 6");
        assertEquals(List.of("np.practice"), order(rule));
    }

    @Test
    void nearIsFlaggedAndDoesNotQualify() {
        CaseResult result = check(Choices.NONE, np("np.near", 5, b -> b.range(Measure.D_OVER_T, 0.35, 0.5)));
        CandidateResult row = result.pick().orElseThrow();
        assertEquals(Verdict.NEAR, row.verdict(), "0.333 is 4.8 % below 0.35");
        assertEquals(Role.EXCLUDED, row.role());
        assertTrue(row.failedBounds().get(0).contains("D/T 0.3333"), row.failedBounds().toString());
        assertEquals(5, row.powerNumber(), "excluded rows carry numbers");
        assertEquals(Status.FLAGGED, result.status());
    }

    @Test
    void nearestIsNamedWhenNothingQualifies() {
        CaseResult result = check(Choices.NONE,
                np("np.far", 4, b -> b.range(Measure.D_OVER_T, 0.6, 0.7)),
                np("np.near", 5, b -> b.range(Measure.D_OVER_T, 0.35, 0.5)),
                np("np.unsure", 6, b -> b.transcription(Transcription.UNSURE)));
        assertEquals("invented.np.near", result.pick().orElseThrow().correlation());
        assertTrue(result.flags().get(0).contains("invented.np.near"));
        assertEquals(4.0 / 5 - 1, Invented.row(result, "np.far").deviation(), 1e-15);
    }

    @Test
    void chosenIsUsedAndTheRecommendationStaysVisible() {
        CaseResult result = check(new Choices(Map.of(Quantity.POWER_NUMBER, "invented.np.b"), Map.of()),
                np("np.a", 5, b -> b), np("np.b", 6, b -> b));
        assertEquals("invented.np.b", result.pick().orElseThrow().correlation());
        assertEquals(Role.CHOSEN, result.pick().orElseThrow().role());
        assertEquals(Role.RECOMMENDED, Invented.row(result, "np.a").role());
        assertEquals(6.0 / 5, result.spread(), 1e-15);
        assertEquals(Status.OK, result.status());
    }

    @Test
    void choosingWhatWouldBeRecommendedIsNoDoubt() {
        CaseResult result = check(new Choices(Map.of(Quantity.POWER_NUMBER, "invented.np.a"), Map.of()),
                np("np.a", 5, b -> b), np("np.b", 6, b -> b));
        assertEquals(Role.CHOSEN, result.pick().orElseThrow().role());
        assertEquals(Role.CANDIDATE, Invented.row(result, "np.b").role(), "a is ahead of it");
        assertTrue(Invented.row(result, "np.b").why().startsWith("qualifies, behind invented.np.a"));
        assertEquals(List.of(), result.flags());
    }

    @Test
    void givenAndChosenExcludeEachOther() {
        String message = assertThrows(IllegalArgumentException.class, () -> new Choices(
                Map.of(Quantity.POWER_NUMBER, "invented.np.a"), Map.of(Quantity.POWER_NUMBER, 5.0))).getMessage();
        assertTrue(message.contains("invented.np.a") && message.contains("5.0"), message);
    }

    @Test
    void chosenOutsideItsBoundsIsFlaggedNotRefused() {
        CaseResult result = check(new Choices(Map.of(Quantity.POWER_NUMBER, "invented.np.b"), Map.of()),
                np("np.a", 5, b -> b), np("np.b", 6, b -> b.range(Measure.D_OVER_T, 0.6, 0.7)));
        assertEquals(Status.FLAGGED, result.status());
        assertEquals(6, result.pick().orElseThrow().powerNumber());
    }

    @Test
    void unknownChoiceIsRefusedNamingColumnAndValue() {
        CaseResult result = check(new Choices(Map.of(Quantity.POWER_NUMBER, "invented.np.none"), Map.of()),
                np("np.a", 5, b -> b));
        assertEquals("correlation", result.refusal().orElseThrow().field());
        assertEquals("invented.np.none", result.refusal().orElseThrow().value());
    }

    @Test
    void givenValuesOverrideEveryCorrelation() {
        CaseResult result = check(new Choices(Map.of(),
                Map.of(Quantity.POWER_NUMBER, 3.5, Quantity.SHEAR_RATE_CONSTANT, 12.0)), np("np.a", 5, b -> b));
        CandidateResult pick = result.pick().orElseThrow();
        assertEquals("given", pick.correlation());
        assertEquals(Role.CHOSEN, pick.role());
        assertEquals(3.5, pick.powerNumber());
        assertEquals("given", pick.shearRateCorrelation());
        assertEquals(24, pick.state().orElseThrow().shearRate());
        assertTrue(result.notes().stream().anyMatch(n -> n.contains("given in the case")), result.notes().toString());
    }

    @Test
    void powerCorrelationKeepsTheConstantThatItsSourceUsed() {
        Correlation other = Invented.constant(Quantity.SHEAR_RATE_CONSTANT, "ks.other", 30, b -> b.scatter(0.5));
        CaseResult result = new CrossCheck(Invented.catalogue(KS, other,
                        np("np.a", 5, b -> b.belongsWith("invented.ks.ten")), np("np.b", 5, b -> b)))
                .check(Invented.water(Choices.NONE));
        assertEquals("invented.ks.ten", Invented.row(result, "np.a").shearRateCorrelation());
        assertEquals("invented.ks.other", Invented.row(result, "np.b").shearRateCorrelation(), "it states a scatter");
        assertFalse(result.candidates().isEmpty());
    }

    @Test
    void furtherQuantitiesRestOnThePowerAndFlowNumberOfThePick() {
        Quantity own = Quantity.of("invented-time", "invented time", "ti", "s");
        Correlation flow = Invented.constant(Quantity.FLOW_NUMBER, "nq.half", 0.5);
        Correlation time = Invented.formula(
                Invented.anywhere(own, "time.own", Variable.POWER_NUMBER, Variable.FLOW_NUMBER, Variable.SPEED).constant("a", 3),
                "{a} Np Nq/N", (g, k) -> p -> k.get("a") * p.get(Variable.POWER_NUMBER) * p.get(Variable.FLOW_NUMBER)
                        / p.get(Variable.SPEED));
        CaseResult result = new CrossCheck(Invented.catalogue(KS, np("np.five", 5, b -> b), flow, time))
                .check(Invented.water(Choices.NONE));
        QuantityResult row = result.quantities().stream().filter(q -> q.quantity().equals(own)).findFirst().orElseThrow();
        assertEquals(3 * 5 * 0.5 / 2, row.value(), 1e-15);
        assertEquals(Role.RECOMMENDED, row.role());
    }

    @Test
    void dischargeIsTakenBeforeCirculationWhateverElseSpeaksForIt() {
        Correlation discharge = Invented.constant(Quantity.FLOW_NUMBER, "nq.discharge", 0.7,
                b -> b.transcription(Transcription.FROM_MEMORY));
        Correlation circulation = Invented.constant(Quantity.FLOW_NUMBER, "nq.circulation", 1.3,
                b -> b.flow(FlowKind.CIRCULATION).scatter(0.01));
        CaseResult result = new CrossCheck(Invented.catalogue(KS, np("np.five", 5, b -> b), circulation, discharge))
                .check(Invented.water(Choices.NONE));
        assertEquals("invented.nq.discharge", result.pick().orElseThrow().flowCorrelation());
        assertEquals(0.7 * 2 * 0.125, result.pick().orElseThrow().pumping(), 1e-15);
    }

    @Test
    void withoutQuantitiesTheCandidatesAreTheSame() {
        CrossCheck full = new CrossCheck(Invented.catalogue(KS, np("np.a", 5, b -> b), np("np.b", 6, b -> b.scatter(0.1))));
        CaseResult everything = full.check(Invented.water(Choices.NONE));
        CaseResult power = full.withoutQuantities().check(Invented.water(Choices.NONE));
        assertEquals(everything.candidates(), power.candidates());
        assertEquals(everything.notes(), power.notes());
        assertEquals(3, everything.quantities().size());
        assertEquals(List.of(), power.quantities());
    }
}
