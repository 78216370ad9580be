package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static stirwright.exchange.Refusals.assertRefused;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import stirwright.core.Arrival;
import stirwright.core.CaseResult;
import stirwright.core.CaseSpec;
import stirwright.core.Catalogue;
import stirwright.core.Choices;
import stirwright.core.Role;
import stirwright.correlation.Quantity;
import stirwright.general.GeneralRelations;
import stirwright.study.Amounts;
import stirwright.study.Parts;
import stirwright.study.Picks;

/** What was settled by hand in a study's case. */
class StudyPicksTest {
    private final InventedStudy invented = new InventedStudy();

    private CaseSpec spec() {
        return invented.entry().spec().orElseThrow();
    }

    @Test
    void correlationsAndValues() {
        Picks.choose(invented.good, "power-number", "blades.np.narrow", "measured on site");
        Picks.choose(invented.good, "shear-rate-constant", "k", "");
        Picks.give(invented.good, "flow-number", 0.8, "the supplier's sheet");
        assertEquals(Map.of(Quantity.POWER_NUMBER, "blades.np.narrow", Quantity.SHEAR_RATE_CONSTANT, "k"),
                spec().choices().correlations());
        assertEquals(Map.of(Quantity.FLOW_NUMBER, 0.8), spec().choices().givens());
        assertEquals(List.of("power number chosen by hand: measured on site",
                "flow number chosen by hand: the supplier's sheet"), spec().remarks());
    }

    @Test
    void aPickIsUsedAndItsReasonPrinted() {
        Picks.choose(invented.good, "power-number", "blades.np.narrow", "measured on site");
        CaseResult result = invented.entry().check(Invented.CROSS_CHECK);
        assertEquals("blades.np.narrow", result.pick().orElseThrow().correlation());
        assertEquals(Role.CHOSEN, result.pick().orElseThrow().role());
        assertTrue(result.notes().contains("power number chosen by hand: measured on site"), () -> "" + result.notes());
    }

    @Test
    void quantitiesWithoutAColumnArePickedToo() {
        Catalogue general = Catalogue.of(List.of(Arrival.of(new GeneralRelations(), "stirwright.general 1")));
        Picks.choose(invented.good, "blend-time", "some.id", "habit");
        CaseSpec chosen = StudyCases.entry(invented.good, general).spec().orElseThrow();
        assertEquals(Map.of(Quantity.BLEND_TIME, "some.id"), chosen.choices().correlations());
        assertEquals(List.of("blend time to 95 % chosen by hand: habit"), chosen.remarks());
        invented.good.getPicks().add(Parts.copy(invented.good.getPicks().get(0)));
        assertRefused(StudyCases.entry(invented.good, general), "pick", "blend-time", "twice");
        Picks.remove(invented.good, "blend-time");
        Picks.give(invented.good, "blend-time", 30, "");
        assertEquals(Map.of(Quantity.BLEND_TIME, 30.0),
                StudyCases.entry(invented.good, general).spec().orElseThrow().choices().givens());
        assertRefused(invented.entry(), "pick", "blend-time", "not a quantity of any installed");
    }

    @Test
    void picksThatDoNotDo() {
        Picks.give(invented.good, "power-number", 0, "");
        assertRefused(invented.entry(), "power_number", "0", "greater than 0");
        Picks.choose(invented.good, "power-number", "", "");
        assertRefused(invented.entry(), "correlation", "", "names no correlation");
        Picks.remove(invented.good, "power-number");
        Picks.choose(invented.good, "colour", "red", "");
        assertRefused(invented.entry(), "pick", "colour", "not a quantity");
    }

    @Test
    void aPickBesideAnAmountOfTheCase() {
        Amounts.set(invented.good.getAmounts(), "shear_rate_constant", 11.5);
        assertEquals(Map.of(Quantity.SHEAR_RATE_CONSTANT, 11.5), spec().choices().givens());
        Picks.give(invented.good, "shear-rate-constant", 12, "");
        assertRefused(invented.entry(), "shear_rate_constant", "12", "11.5 of the case");
        Picks.choose(invented.good, "shear-rate-constant", "k", "");
        assertRefused(invented.entry(), "shear_rate_constant", "11.5", "shear_rate_correlation k");
    }

    @Test
    void anotherFamilyHasNoPicks() {
        Picks.choose(invented.good, "power-number", "blades.np.narrow", "measured on site");
        Amounts.set(invented.good.getAmounts(), "shear_rate_constant", 11.5);
        CaseSpec other = StudyCases.entry(invented.good, Invented.CATALOGUE, "blades").spec().orElseThrow();
        assertEquals(Choices.NONE, other.choices());
        assertEquals(List.of("shear_rate_constant 11.5 was given for another family; not used for blades"), other.remarks());
        assertEquals(spec().geometry(), other.geometry());
        assertEquals("plate", StudyCases.entry(invented.good, Invented.CATALOGUE, "plate").family());
        assertEquals(1, invented.good.getPicks().size(), "the study stays as it is");
    }
}
