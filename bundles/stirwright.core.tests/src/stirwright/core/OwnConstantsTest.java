package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import stirwright.correlation.Correlation;
import stirwright.correlation.Effect;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Standing;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;
import stirwright.correlation.Verdict;
import stirwright.rheology.PowerLaw;

/** A correlation of which the case changes constants stands beside the one it was made from, as a draft. */
class OwnConstantsTest {
    private static final Correlation KS = Invented.constant(Quantity.SHEAR_RATE_CONSTANT, "ks.ten", 10);
    private static final Correlation NP = Invented.constant(Quantity.POWER_NUMBER, "np.five", 5);
    private static final Correlation TWO = Invented.anywhere(Quantity.POWER_NUMBER, "np.two").constant("a", 2).constant("b", 3)
            .formula("{a} + {b}").relation((g, k) -> p -> k.get("a") + k.get("b")).build();
    private static final Correlation FACTOR = Correlation.modifier("invented.np.factor", Quantity.POWER_NUMBER,
                    Effect.CLEARANCE, "factor").families(Invented.FAMILY).cite(Invented.SOURCE)
            .transcription(Transcription.FROM_MEMORY).value("a", 1).build();
    private static final Correlation FOREIGN = Correlation.of("other.np.eight", Quantity.POWER_NUMBER, "of another family")
            .families("other").cite(Invented.SOURCE).transcription(Transcription.FROM_MEMORY).value("a", 8).build();
    private static final Catalogue CATALOGUE = Invented.catalogue(KS, NP, TWO, FACTOR, FOREIGN);

    private static Choices choices(Map<Quantity, String> picks, Map<String, Map<String, Double>> constants) {
        return new Choices(picks, Map.of(), Set.of(), constants);
    }

    private static CaseResult check(Map<String, Map<String, Double>> constants) {
        return new CrossCheck(CATALOGUE).check(Invented.water(choices(Map.of(), constants)));
    }

    @Test
    void bothStandSideBySideAndTheChangedOneIsNeverRecommended() {
        CaseResult result = check(Map.of("invented.np.five", Map.of("a", 4.0)));
        assertEquals(5, Invented.row(result, "np.five").powerNumber());
        CandidateResult changed = Invented.row(result, "np.five-changed");
        assertEquals(4, changed.powerNumber());
        assertEquals(Role.EXCLUDED, changed.role());
        assertTrue(changed.why().contains("in-house draft"), changed.why());
        assertEquals(Role.RECOMMENDED, result.candidates().get(0).role());
        assertTrue(result.notes().stream().anyMatch(n -> n.contains("invented.np.five-changed has a = 4 in place of 5")),
                result.notes().toString());
    }

    @Test
    void aChosenShearRateConstantWithoutValueIsBlamedAndNotTheSpeed() {
        Map<String, Map<String, Double>> negative = Map.of("invented.ks.ten", Map.of("a", -3.0));
        Choices changed = choices(Map.of(Quantity.SHEAR_RATE_CONSTANT, "invented.ks.ten-changed"), negative);
        for (SpeedDemand demand : List.of(new SpeedDemand.At(2), new SpeedDemand.ForTipSpeed(3),
                new SpeedDemand.ForShearRate(20), new SpeedDemand.ForPowerPerVolume(100))) {
            assertEquals("constants", refused(CATALOGUE, demand, changed).field(), demand.toString());
        }
        Correlation negativeInstalled = Invented.constant(Quantity.SHEAR_RATE_CONSTANT, "ks.negative", -1);
        Choices installed = choices(Map.of(Quantity.SHEAR_RATE_CONSTANT, "invented.ks.negative"), Map.of());
        Refusal refusal = refused(Invented.catalogue(KS, NP, negativeInstalled), new SpeedDemand.At(2), installed);
        assertEquals("shear_rate_correlation", refusal.field());
        assertEquals("invented.ks.negative", refusal.value());
        Choices sound = choices(Map.of(Quantity.SHEAR_RATE_CONSTANT, "invented.ks.ten"), Map.of());
        assertEquals("target_power_per_volume_W_m3",
                refused(CATALOGUE, new SpeedDemand.ForPowerPerVolume(1e12), sound).field());
    }

    private static Refusal refused(Catalogue catalogue, SpeedDemand demand, Choices choices) {
        CaseSpec water = Invented.water(choices);
        return new CrossCheck(catalogue).check(new CaseSpec("case", Invented.FAMILY, water.geometry(), demand, water.fluid(),
                choices, List.of())).refusal().orElseThrow();
    }

    @Test
    void constantsThatAreNotNamedKeepTheirValues() {
        assertEquals(2 + 0.5, Invented.row(check(Map.of("invented.np.two", Map.of("b", 0.5))), "np.two-changed").powerNumber());
    }

    @Test
    void itCanBeChosenAndThenItIsUsed() {
        Choices chosen = choices(Map.of(Quantity.SHEAR_RATE_CONSTANT, "invented.ks.ten-changed"),
                Map.of("invented.ks.ten", Map.of("a", 6.5)));
        CandidateResult pick = new CrossCheck(CATALOGUE).check(Invented.water(chosen)).pick().orElseThrow();
        assertEquals(6.5 * 2, pick.state().orElseThrow().shearRate(), 1e-12);
        assertEquals("invented.ks.ten-changed", pick.shearRateCorrelation());
    }

    /** Re is rho N D^2/(K (ks N)^(n - 1)): 45 with the constant 10 and 14 with 1, which is nearer to the bound. */
    @Test
    void thoughNearerToItsBoundsItIsNotUsedUnlessChosen() {
        Correlation laminar = Invented.correlation(Quantity.SHEAR_RATE_CONSTANT, "ks.laminar").atMost(Measure.REYNOLDS, 0.1)
                .value("a", 10).build();
        CaseSpec plain = Invented.at(2, new PowerLaw(50, 0.5));
        CaseSpec spec = new CaseSpec("case", Invented.FAMILY, plain.geometry(), plain.speed(), plain.fluid(),
                choices(Map.of(), Map.of("invented.ks.laminar", Map.of("a", 1.0))), List.of());
        CandidateResult pick = new CrossCheck(Invented.catalogue(laminar, NP)).check(spec).pick().orElseThrow();
        assertEquals("invented.ks.laminar", pick.shearRateCorrelation());
    }

    /** Only what the case itself made stands back; a name alone means nothing. */
    @Test
    void anInstalledOneOfThatNameIsRankedLikeAnyOther() {
        Correlation near = Invented.correlation(Quantity.POWER_NUMBER, "np.near-changed").atMost(Measure.REYNOLDS, 0.2)
                .value("a", 10).build();
        Correlation far = Invented.correlation(Quantity.POWER_NUMBER, "np.far").atMost(Measure.REYNOLDS, 0.1).value("a", 10).build();
        CaseResult result = new CrossCheck(Invented.catalogue(KS, near, far)).check(Invented.water(Choices.NONE));
        assertEquals("invented.np.near-changed", result.pick().orElseThrow().correlation());
    }

    @Test
    void whatIsInstalledStaysAsItIs() {
        check(Map.of("invented.np.five", Map.of("a", 4.0)));
        assertTrue(CATALOGUE.entry("invented.np.five-changed").isEmpty());
        assertEquals(5, Invented.row(check(Map.of()), "np.five").powerNumber());
        assertEquals(2, check(Map.of()).candidates().size());
    }

    @Test
    void anOpenCaseDrawsIt() {
        OpenCase open = new CrossCheck(CATALOGUE).open(Invented.water(choices(Map.of(), Map.of("invented.np.five", Map.of("a", 4.0)))));
        double[] y = new double[1];
        open.slice(Quantity.POWER_NUMBER, "invented.np.five-changed", Variable.REYNOLDS)
                .evaluate(new double[] {100}, y, new Verdict[1]);
        assertEquals(4, y[0]);
        assertEquals(Standing.IN_HOUSE_DRAFT, open.catalogue().orElseThrow().entry("invented.np.five-changed").orElseThrow()
                .correlation().standing());
    }

    @Test
    void aChangedOneIsThereOnlyWhileSomethingOfItIsChanged() {
        Map<Quantity, String> pick = Map.of(Quantity.POWER_NUMBER, "invented.np.five-changed");
        Refusal none = new CrossCheck(CATALOGUE).check(Invented.water(choices(pick, Map.of()))).refusal().orElseThrow();
        assertTrue(none.reason().contains("only while the case changes constants of invented.np.five"), none.reason());
        assertEquals("correlation", none.field());
    }

    @Test
    void whatIsNotThereIsRefusedWithWhatIs() {
        refused(Map.of("invented.np.none", Map.of("a", 1.0)), "'invented.np.none'", "no installed correlation");
        refused(Map.of("invented.np.two", Map.of("c", 1.0)), "'invented.np.two'", "no constant 'c'", "a = 2, b = 3");
        refused(Map.of("invented.np.factor", Map.of("a", 2.0)), "'invented.np.factor'", "is a factor", "'clearance'");
    }

    private static void refused(Map<String, Map<String, Double>> constants, String... parts) {
        Refusal refusal = check(constants).refusal().orElseThrow();
        assertEquals("constants", refusal.field());
        List.of(parts).forEach(part -> assertTrue(refusal.reason().contains(part), refusal.reason()));
    }

    @Test
    void oneOfAnotherFamilyChangesNothingAndThatIsSaid() {
        CaseResult result = check(Map.of("other.np.eight", Map.of("a", 9.0)));
        assertEquals(check(Map.of()).candidates().size(), result.candidates().size());
        assertTrue(result.notes().stream().anyMatch(n -> n.contains("other.np.eight is not for family invented")),
                result.notes().toString());
    }
}
