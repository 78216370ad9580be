package stirwright.correlation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;

/** A correlation is a value: nothing changes it, and a variant is another one. */
class CorrelationTest {
    private static final Geometry ANY = p -> 1;

    private static CorrelationBuilder builder() {
        return Correlation.of("invented.np.test", Quantity.POWER_NUMBER, "invented for a test")
                .families("invented").cite(Citation.withoutLocator("invented"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .range(Measure.D_OVER_T, 0.2, 0.5).contains(Effect.FROUDE).reads(Variable.REYNOLDS).remark("First.")
                .constant("a", 3).curve("phi", 1, 2, 10, 2).formula("Np = {a} + {phi}")
                .relation((g, k) -> p -> k.get("a") + k.curve("phi").at(1));
    }

    @Test
    void usingTheBuilderFurtherChangesNothing() {
        CorrelationBuilder builder = builder();
        Correlation first = builder.build();
        Correlation second = builder.families("other").standing(Standing.RETIRED).notStated(Measure.H_OVER_T, "unread")
                .contains(Effect.BAFFLES).reads(Variable.FROUDE).remark("Second.").constant("b", 4)
                .formula("Np = {a} + {b} + {phi}").relation((g, k) -> p -> k.get("b")).build();
        assertEquals(Set.of("invented"), first.families());
        assertEquals(Standing.PUBLISHED, first.standing());
        assertEquals(1, first.validity().size());
        assertEquals(Set.of(Effect.FROUDE), first.contains());
        assertEquals(Set.of(Variable.REYNOLDS), first.reads());
        assertEquals(List.of("First."), first.remarks());
        assertEquals(Set.of("a"), first.constants().names());
        assertTrue(first.formula().startsWith("Np = 3 + through"), first.formula());
        assertEquals("Np = a + phi", first.formulaByName());
        assertEquals(5, first.bind(ANY).at(null), 1e-12);
        assertEquals(4, second.bind(ANY).at(null));
        assertEquals(2, second.validity().size());
    }

    @Test
    void whatItHandsOutCannotBeChanged() {
        Correlation correlation = builder().build();
        List<Executable> attempts = List.of(
                () -> correlation.families().clear(), () -> correlation.contains().clear(),
                () -> correlation.reads().clear(), () -> correlation.validity().clear(),
                () -> correlation.remarks().clear(), () -> correlation.constants().names().clear(),
                () -> correlation.constants().curveNames().clear());
        attempts.forEach(attempt -> assertThrows(UnsupportedOperationException.class, attempt));
        assertEquals(Set.of("a"), correlation.constants().names());
    }

    @Test
    void aVariantIsADraftThatSaysWhereItComesFrom() {
        Correlation published = builder().build();
        Correlation variant = published.variant("invented.np.mine",
                published.constants().with("a", 5).withCurve("phi", phi -> phi.scaled(3)));
        assertEquals("invented.np.mine", variant.id());
        assertEquals(Standing.IN_HOUSE_DRAFT, variant.standing());
        assertEquals(List.of("First.", "Constants changed from invented.np.test."), variant.remarks());
        // 5 + 3 * 2
        assertEquals(11, variant.bind(ANY).at(null), 1e-12);
        assertTrue(variant.formula().startsWith("Np = 5 + through (1, 6)"), variant.formula());
        assertEquals(published.validity(), variant.validity());
        assertEquals(published.citation(), variant.citation());
        assertEquals("invented.np.test", published.id());
        assertEquals(Standing.PUBLISHED, published.standing());
        assertEquals(List.of("First."), published.remarks());
        assertEquals(5, published.bind(ANY).at(null), 1e-12);
    }

    @Test
    void aVariantNeedsAnotherIdAndTheSameNames() {
        Correlation correlation = builder().build();
        Constants more = builder().constant("b", 1).formula("{a} {b} {phi}").build().constants();
        Constants other = builder().curve("psi", 1, 1, 2, 2).formula("{a} {phi} {psi}").build().constants();
        assertTrue(refusal(correlation, "invented.np.mine", more).contains("[a, b]"));
        assertTrue(refusal(correlation, "invented.np.mine", other).contains("[phi, psi]"));
        assertTrue(refusal(correlation, "invented.np.test", correlation.constants()).contains("id of its own"));
        assertTrue(refusal(correlation, "Mine", correlation.constants()).contains("'Mine'"));
    }

    private static String refusal(Correlation correlation, String id, Constants constants) {
        return assertThrows(ContractException.class, () -> correlation.variant(id, constants)).getMessage();
    }
}
