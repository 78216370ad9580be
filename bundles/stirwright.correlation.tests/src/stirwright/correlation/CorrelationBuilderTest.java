package stirwright.correlation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.function.UnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class CorrelationBuilderTest {
    private static final Geometry ANY = p -> 2;

    private static CorrelationBuilder start(String id) {
        return Correlation.of(id, Quantity.POWER_NUMBER, "invented for a test")
                .families("invented").cite(Citation.withoutLocator("invented"))
                .transcription(Transcription.FROM_MEMORY);
    }

    private static CorrelationBuilder complete() {
        return start("invented.np.test").constant("a", 2.512).constant("b", -0.195)
                .formula("Np = {a} (t/D)^{b}")
                .relation((g, k) -> p -> k.get("a") * Math.pow(0.01, k.get("b")));
    }

    @Test
    void formulaIsPrintedFromTheConstantsThatComputeTheNumber() {
        Correlation correlation = complete().build();
        assertEquals("Np = 2.512 (t/D)^-0.195", correlation.formula());
        // 0.01^-0.195 = exp(0.195 * 4.60517) = 2.454709; times 2.512 = 6.166229
        assertEquals(6.166229, correlation.bind(ANY).at(null), 1e-5);
    }

    @Test
    void whatIsMissingIsNamedWithTheId() {
        String[] problems = {
            message(b -> b, start("invented.np.test").constant("a", 1).formula("{a}")),
            message(b -> b, Correlation.of("invented.np.test", Quantity.POWER_NUMBER, "t").families("x")
                    .transcription(Transcription.UNSURE).formula("1").relation((g, k) -> p -> 1)),
            message(b -> b, Correlation.of("invented.np.test", Quantity.POWER_NUMBER, "t")
                    .cite(Citation.commonPractice()).transcription(Transcription.UNSURE).formula("1").relation((g, k) -> p -> 1)),
        };
        assertTrue(problems[0].contains("invented.np.test") && problems[0].contains("relation"), problems[0]);
        assertTrue(problems[1].contains("citation"), problems[1]);
        assertTrue(problems[2].contains("families"), problems[2]);
    }

    @Test
    void formulaAndConstantsMustNameTheSame() {
        assertTrue(message(b -> b.constant("c", 3), complete()).contains("[a, b, c]"));
        assertTrue(message(b -> b.formula("Np = {a} {b} {d}"), complete()).contains("[a, b, d]"));
    }

    @Test
    void aNameIsGivenOnce() {
        assertTrue(message(b -> b.constant("a", 3), complete()).contains("second constant or curve 'a'"));
        assertTrue(message(b -> b.curve("a", 1, 1, 2, 2), complete()).contains("second constant or curve 'a'"));
        assertTrue(message(b -> b.curve("phi", 1, 1, 2, 2).curve("phi", 1, 1, 2, 2), complete()).contains("'phi'"));
    }

    @Test
    void whatIsNoNumberIsRefusedAtOnce() {
        assertTrue(message(b -> b.constant("c", Double.NaN), complete()).contains("constant 'c'"));
        assertTrue(message(b -> b.scatter(-0.1), complete()).contains("scatter -0.1"));
    }

    @Test
    void onlyAModifierAppliesNowAndThen() {
        assertTrue(message(b -> b.appliesWhen("two blades", g -> true), complete()).contains("appliesWhen"));
    }

    @Test
    void turbulentInWordsTakesTheGeneralLimitAndSaysSo() {
        Correlation words = complete().turbulent().build();
        assertEquals("Reynolds number at least 10000", words.bound(Measure.REYNOLDS).orElseThrow().words());
        assertTrue(words.remarks().get(0).contains("10000 is from J. F. Steffe"), words.remarks().toString());
    }

    @Test
    void flowNumbersMustSayWhichFlow() {
        CorrelationBuilder flow = Correlation.of("invented.nq.test", Quantity.FLOW_NUMBER, "t").families("x")
                .cite(Citation.commonPractice()).transcription(Transcription.UNSURE).formula("1").relation((g, k) -> p -> 1);
        assertTrue(message(b -> b, flow).contains("discharge or circulation"));
        assertEquals(FlowKind.DISCHARGE, flow.flow(FlowKind.DISCHARGE).build().flowKind().orElseThrow());
        assertTrue(message(b -> b.flow(FlowKind.DISCHARGE), complete()).contains("discharge or circulation"));
    }

    @Test
    void aSecondBoundOnOneSubjectIsRefused() {
        CorrelationBuilder builder = complete().range(Measure.D_OVER_T, 0.2, 0.5);
        assertThrows(ContractException.class, () -> builder.notStated(Measure.D_OVER_T, "twice"));
    }

    @Test
    void nominalValuesAllowForRoundedDrawings() {
        Bound bound = complete().nominal(Measure.W_OVER_D, 0.2).build().bound(Measure.W_OVER_D).orElseThrow();
        assertEquals("W/D 0.195 to 0.205, nominal 0.2", bound.words());
    }

    @ParameterizedTest
    @ValueSource(strings = {"np", "Np.Test", "a..b", "a.b c", "", ".a", "a.-b", "a.b-"})
    void idsAreWordsJoinedByDots(String id) {
        String message = assertThrows(ContractException.class, () -> start(id).constant("a", 1).formula("{a}")
                .relation((g, k) -> p -> 1).build()).getMessage();
        assertTrue(message.contains("'" + id + "'"), message);
    }

    @Test
    void belongsToItsFamiliesOrToAny() {
        Correlation one = complete().build();
        assertTrue(one.holdsFor("invented"));
        assertFalse(one.holdsFor("other"));
        Correlation any = Correlation.modifier("general.np.test", Quantity.POWER_NUMBER, Effect.FROUDE, "t").anyFamily()
                .cite(Citation.commonPractice()).transcription(Transcription.UNSURE).formula("1")
                .appliesWhen("without baffles", g -> g.get(Dimensions.BAFFLE_COUNT) == 0)
                .relation((g, k) -> p -> 1).build();
        assertTrue(any.holdsFor("whatever"));
        assertFalse(any.appliesTo(ANY));
        assertEquals(Effect.FROUDE, any.modifierFor().orElseThrow());
    }

    @Test
    void termsAreEqualByKindAndId() {
        assertEquals(Quantity.of("power-number", "by another bundle", "Po", "-"), Quantity.POWER_NUMBER);
        assertNotEquals((Object) Variable.of("froude", "Froude number", "Fr", "-"), Effect.FROUDE);
    }

    private static String message(UnaryOperator<CorrelationBuilder> change, CorrelationBuilder builder) {
        return assertThrows(ContractException.class, () -> change.apply(builder).build()).getMessage();
    }
}
