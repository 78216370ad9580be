package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.RegimeLimits;
import stirwright.rheology.ModelKind;

class CaseFieldsTest {
    /** Of families that are not here yet. */
    private static final Set<String> LATER = Set.of(
            "pitch_ratio", "impeller_height_m", "ribbon_width_m", "ribbon_count", "shaft_diameter_m", "draft_tube_diameter_m");

    private static final Set<String> WORDS =
            Set.of("case", "family", "correlation", "shear_rate_correlation", "flow_number_correlation", "model", "effects_left_out", "constants");

    @Test
    void everyNumberOfTheHelpPageHasAFieldInTheUnitThatThePageSays() throws IOException {
        Map<String, String> page = unitsOfPage();
        WORDS.forEach(page::remove);
        assertTrue(page.size() > 30, () -> "read only " + page);
        Set<String> missing = new TreeSet<>(page.keySet());
        for (CaseField field : Typing.fields()) {
            assertEquals(page.get(field.column()), field.unit(), field.column());
            missing.remove(field.column());
        }
        missing.removeAll(LATER);
        assertEquals(Set.of(), missing);
    }

    /** Unit by column. A cell names one unit for all its columns, or one for each. */
    private static Map<String, String> unitsOfPage() throws IOException {
        String page = Files.readString(Path.of("..", "stirwright.console", "help", "tables.md"));
        String table = page.substring(page.indexOf("## Case table"), page.indexOf("### Models"));
        Map<String, String> units = new HashMap<>();
        table.lines().filter(l -> l.startsWith("| `")).map(l -> l.split("\\|")).forEach(cells -> {
            String[] names = cells[1].replace("`", "").strip().split(", | or ");
            String[] each = cells[2].strip().split(", | or ");
            for (int i = 0; i < names.length; i++) {
                units.put(names[i], each[each.length == 1 ? 0 : i]);
            }
        });
        return units;
    }

    @Test
    void aFamilyIsSplitIntoVesselAndImpeller() {
        Family family = Typing.FAMILIES.get(0);
        assertEquals(List.of("vessel_diameter_m", "liquid_height_m", "liquid_volume_m3", "baffle_count", "baffle_width_m"),
                columns(CaseFields.vessel(family)));
        List<String> impeller = columns(CaseFields.impeller(family));
        assertTrue(impeller.containsAll(List.of("impeller_diameter_m", "clearance_m", "wall_gap_m", "impeller_count",
                "impeller_spacing_m", "blade_count")), impeller::toString);
        List<String> both = new ArrayList<>(columns(CaseFields.vessel(family)));
        both.addAll(impeller);
        assertEquals(family.parameters().stream().map(p -> p.column()).sorted().toList(), both.stream().sorted().toList());
    }

    @Test
    void aDimensionSaysWhatTheFamilyMeansByIt() {
        Family family = Family.of("hanging", "hanging impeller").description("Invented.")
                .parameter(Dimensions.CLEARANCE.withMeaning("lower edge above the bottom"))
                .regimes(RegimeLimits.IN_GENERAL).build();
        CaseField clearance = CaseFields.impeller(family).stream().filter(f -> f.column().equals("clearance_m")).findFirst()
                .orElseThrow();
        assertEquals("lower edge above the bottom", clearance.meaning());
        assertEquals("C", clearance.symbol());
    }

    @Test
    void aModelHasItsParametersInTheTradesWords() {
        assertEquals(List.of(
                        new CaseField("zero_shear_viscosity_Pa_s", "zero-shear viscosity", "m0", "Pa s"),
                        new CaseField("infinite_shear_viscosity_Pa_s", "infinite-shear viscosity", "mi", "Pa s"),
                        new CaseField("time_constant_s", "time constant", "t", "s"),
                        new CaseField("flow_index", "flow index", "n", "-")),
                CaseFields.model(ModelKind.CROSS));
    }

    @Test
    void onlyAModelWithAYieldStressHasFieldsForItsBounds() {
        for (ModelKind kind : ModelKind.values()) {
            boolean yields = columns(CaseFields.model(kind)).contains("yield_stress_Pa");
            assertEquals(yields ? List.of("yield_stress_low_Pa", "yield_stress_high_Pa") : List.of(),
                    columns(CaseFields.yieldBounds(kind)), kind::id);
        }
    }

    /** A family may mean something of its own by it, but calls it as every other does. */
    @Test
    void eachColumnIsOneField() {
        List<CaseField> withoutMeaning = Typing.fields().stream()
                .map(f -> new CaseField(f.column(), f.title(), f.symbol(), f.unit())).distinct().toList();
        assertEquals(withoutMeaning.size(), Set.copyOf(columns(withoutMeaning)).size());
        Typing.fields().forEach(f -> assertFalse(f.title().isBlank() || f.symbol().isBlank(), f::column));
    }

    @Test
    void aUnitThatNobodyCanReadIsNoUnitOfAField() {
        assertEquals("length_furlong: no field is shown in unit 'furlong'",
                assertThrows(IllegalArgumentException.class,
                        () -> new CaseField("length_furlong", "length", "l", "furlong")).getMessage());
    }

    private static List<String> columns(List<CaseField> fields) {
        return fields.stream().map(CaseField::column).toList();
    }
}
