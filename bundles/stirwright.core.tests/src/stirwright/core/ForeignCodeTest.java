package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Family;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Relation;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;
import stirwright.rheology.PowerLaw;

/** What contributed code throws costs its own candidate, never the case or the run. */
class ForeignCodeTest {
    private static final Correlation KS = Invented.constant(Quantity.SHEAR_RATE_CONSTANT, "ks.ten", 10);
    private static final Correlation GOOD = Invented.constant(Quantity.POWER_NUMBER, "np.good", 5);

    private static double broken() {
        throw new IllegalStateException("broken on purpose");
    }

    private static Correlation np(Relation relation) {
        return Invented.formula(Invented.anywhere(Quantity.POWER_NUMBER, "np.broken").constant("a", 1), "{a}", relation);
    }

    static Stream<Correlation> brokenCorrelations() {
        return Stream.of(
                np((g, k) -> {
                    throw new IllegalStateException("broken on purpose");
                }),
                np((g, k) -> p -> broken()),
                np((g, k) -> p -> {
                    throw new NoSuchMethodError("gone from a library");
                }),
                Invented.constant(Quantity.POWER_NUMBER, "np.broken", 5,
                        b -> b.range(Measure.of("odd", "odd", (g, p) -> broken()), 0, 1)),
                Invented.formula(Correlation.modifier("invented.np.broken", Quantity.POWER_NUMBER, Effect.FROUDE, "t")
                                .families(Invented.FAMILY).cite(Invented.SOURCE)
                                .transcription(Transcription.FROM_MEMORY)
                                .appliesWhen("never says", g -> broken() > 0).constant("a", 1),
                        "{a}", (g, k) -> p -> 1));
    }

    @ParameterizedTest
    @MethodSource("brokenCorrelations")
    void costsItsOwnCandidateAlone(Correlation broken) {
        Correlation immune = Invented.constant(Quantity.POWER_NUMBER, "np.immune", 4, b -> b.contains(Effect.FROUDE));
        CaseResult result = new CrossCheck(Invented.catalogue(KS, GOOD, immune, broken)).check(Invented.water(Choices.NONE));
        assertEquals(4, Invented.row(result, "np.immune").powerNumber());
        List<CandidateResult> failed = result.candidates().stream().filter(c -> c.why().contains("its code fails")).toList();
        assertEquals(1, failed.size(), result.candidates().toString());
        assertEquals(Role.EXCLUDED, failed.get(0).role());
        assertTrue(failed.get(0).why().matches(".*(broken on purpose|gone from a library).*"), failed.get(0).why());
    }

    @Test
    void powerNumberThatFailsOnTheWayToATargetIsNamed() {
        CaseResult result = new CrossCheck(Invented.catalogue(KS, GOOD, np((g, k) -> p -> broken())))
                .check(Invented.demand(new SpeedDemand.ForPowerPerVolume(250), new PowerLaw(2, 0.5)));
        assertEquals("invented.np.good", result.pick().orElseThrow().correlation());
        assertTrue(Invented.row(result, "np.broken").why().contains("code fails: java.lang.IllegalStateException: broken"),
                Invented.row(result, "np.broken").why());
    }

    @Test
    void shearRateConstantThatFailsIsNamed() {
        Correlation ks = Invented.formula(Invented.anywhere(Quantity.SHEAR_RATE_CONSTANT, "ks.broken", Variable.REYNOLDS)
                .constant("a", 1), "{a}", (g, k) -> p -> broken());
        CaseResult result = new CrossCheck(Invented.catalogue(KS, GOOD, ks)).check(Invented.at(2, new PowerLaw(2, 0.5)));
        assertEquals("invented.ks.ten", result.pick().orElseThrow().shearRateCorrelation());
        assertTrue(why(result, "invented.ks.broken").contains("its code fails"), why(result, "invented.ks.broken"));
    }

    @Test
    void whatIsNotKnownIsNamedInsteadOfIterated() {
        Correlation ks = Invented.formula(Invented.anywhere(Quantity.SHEAR_RATE_CONSTANT, "ks.power", Variable.POWER_NUMBER)
                .constant("a", 1), "{a} Np", (g, k) -> p -> k.get("a") * p.get(Variable.POWER_NUMBER));
        CaseResult result = new CrossCheck(Invented.catalogue(KS, GOOD, ks)).check(Invented.at(2, new PowerLaw(2, 0.5)));
        assertEquals("excluded: it needs the power number, which is not known here", why(result, "invented.ks.power"));
    }

    @Test
    void flowNumberThatReadsItselfIsNotKnown() {
        Correlation nq = Invented.formula(Invented.anywhere(Quantity.FLOW_NUMBER, "nq.self", Variable.FLOW_NUMBER)
                .constant("a", 1), "{a} Nq", (g, k) -> p -> k.get("a") * p.get(Variable.FLOW_NUMBER));
        CaseResult result = new CrossCheck(Invented.catalogue(KS, GOOD, nq)).check(Invented.water(Choices.NONE));
        assertTrue(why(result, "invented.nq.self").contains("it needs the flow number"), why(result, "invented.nq.self"));
    }

    private static String why(CaseResult result, String id) {
        return result.quantities().stream().filter(q -> q.id().equals(id)).findFirst().orElseThrow().why();
    }

    @Test
    void factorThatFailsCostsOnlyWhatItWouldBeAppliedTo() {
        Correlation factor = Invented.formula(Correlation.modifier("invented.np.broken", Quantity.POWER_NUMBER, Effect.FROUDE, "t")
                .families(Invented.FAMILY).cite(Invented.SOURCE).transcription(Transcription.FROM_MEMORY).constant("a", 1),
                "{a}", (g, k) -> p -> broken());
        Correlation immune = Invented.constant(Quantity.POWER_NUMBER, "np.immune", 4, b -> b.contains(Effect.FROUDE));
        CaseResult result = new CrossCheck(Invented.catalogue(KS, GOOD, immune, factor)).check(Invented.water(Choices.NONE));
        assertEquals("invented.np.immune", result.pick().orElseThrow().correlation());
        assertEquals(Role.EXCLUDED, Invented.row(result, "np.good").role());
    }

    @Test
    void familyWhoseRuleFailsIsRefusedByName() {
        Contribution broken = new Contribution() {
            @Override
            public List<Family> families() {
                return List.of(Family.of(Invented.FAMILY, "broken").description("invented for a test")
                        .regimes(RegimeLimits.IN_GENERAL)
                        .rule(Dimensions.CLEARANCE, "whatever", g -> broken() > 0).build());
            }

            @Override
            public List<Correlation> correlations() {
                return List.of(KS, GOOD);
            }
        };
        CrossCheck check = new CrossCheck(Catalogue.of(List.of(Arrival.of(broken, "broken 1"))));
        CaseSpec spec = Invented.water(Choices.NONE);
        assertEquals("family", check.check(spec).refusal().orElseThrow().field());
        assertEquals("family", assertThrows(CaseRefusedException.class, () -> check.open(spec).slice(
                Quantity.POWER_NUMBER, "invented.np.good", Variable.REYNOLDS)).refusal().field());
    }
}
