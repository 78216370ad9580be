package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static stirwright.exchange.Refusals.assertAccepted;
import static stirwright.exchange.Refusals.assertRefused;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import stirwright.core.CaseResult;
import stirwright.core.CaseSpec;
import stirwright.core.Choices;
import stirwright.core.Status;
import stirwright.correlation.Quantity;

/** Names, families, dimensions and choices of a row. */
class CaseRowTest {
    @TempDir
    Path folder;

    private CaseSpec spec(Sheet sheet) {
        return sheet.entry(folder).spec().orElseThrow();
    }

    @Test
    void goodRow() {
        CaseEntry entry = Sheet.good().entry(folder);
        assertAccepted(entry);
        CaseSpec spec = entry.spec().orElseThrow();
        assertEquals("A", spec.name());
        assertEquals("blades", spec.familyId());
        assertEquals(Map.of("impeller_diameter", 0.5, "vessel_diameter", 1.5, "baffle_count", 4.0), spec.geometry());
        assertEquals(Choices.NONE, spec.choices());
        assertEquals(List.of(), spec.remarks());
        assertEquals(2, entry.line());
    }

    @Test
    void nameIsNeeded() {
        CaseEntry entry = Sheet.good().with("case", " ").entry(folder);
        assertRefused(entry, "case", "", "blank", "line 2");
        assertEquals("line 2", entry.name());
    }

    @Test
    void nameIsUnique() {
        String row = Sheet.good().row() + "\n";
        CaseTable table = Sheet.read(folder, Sheet.good().header() + "\n" + row + "# between\n" + row);
        assertAccepted(table.entries().get(0));
        assertRefused(table.entries().get(1), "case", "A", "line 2", "line 4");
    }

    @Test
    void familyIsNeededAndLeftToTheCoreOtherwise() {
        assertRefused(Sheet.good().with("family", "").entry(folder), "family", "", "blank");
        CaseEntry unknown = Sheet.good().with("family", "Nosuch").entry(folder);
        assertAccepted(unknown);
        CaseResult result = unknown.check(Invented.CROSS_CHECK);
        assertEquals(Status.REFUSED, result.status());
        assertEquals("family", result.refusal().orElseThrow().field());
        assertEquals("Nosuch", result.refusal().orElseThrow().value());
        assertEquals("blades", spec(Sheet.good().with("family", "Blades")).familyId());
    }

    @Test
    void anglesAreDegrees() {
        assertEquals(Math.PI / 2, spec(Sheet.good().with("blade_angle_deg", "90")).geometry().get("blade_angle"));
        assertEquals(Status.OK, Sheet.good().with("blade_angle_deg", "90").with("clearance_m", "0.5")
                .with("liquid_height_m", "1.5").entry(folder).check(Invented.CROSS_CHECK).status());
    }

    @Test
    void dimensionsOfOtherFamiliesAreIgnoredAndSaidSo() {
        Sheet sheet = Sheet.good().with("pitch_ratio", "1.5").with("ribbon_width_m", "wide");
        List<String> remarks = spec(sheet).remarks();
        assertEquals(2, remarks.size());
        assertTrue(remarks.get(0).startsWith("pitch_ratio 1.5 is not a dimension of family blades"));
        assertTrue(remarks.get(1).startsWith("ribbon_width_m wide is not"));
        assertEquals(spec(Sheet.good()).geometry(), spec(sheet).geometry());
    }

    @Test
    void chosenCorrelations() {
        Sheet sheet = Sheet.good().with("correlation", "blades.np.narrow").with("shear_rate_correlation", "k")
                .with("flow_number_correlation", "q");
        assertEquals(Map.of(Quantity.POWER_NUMBER, "blades.np.narrow", Quantity.SHEAR_RATE_CONSTANT, "k",
                Quantity.FLOW_NUMBER, "q"), spec(sheet).choices().correlations());
    }

    @Test
    void givenValues() {
        Sheet sheet = Sheet.good().with("power_number", "3.5").with("shear_rate_constant", "11").with("flow_number", "0.8");
        assertEquals(Map.of(Quantity.POWER_NUMBER, 3.5, Quantity.SHEAR_RATE_CONSTANT, 11.0, Quantity.FLOW_NUMBER, 0.8),
                spec(sheet).choices().givens());
        assertRefused(Sheet.good().with("power_number", "0").entry(folder), "power_number", "0", "greater than 0");
        assertRefused(Sheet.good().with("flow_number", "-1").entry(folder), "flow_number", "-1", "greater than 0");
    }

    @Test
    void aGivenValueBesideAChosenCorrelation() {
        assertRefused(Sheet.good().with("power_number", "5").with("correlation", "x").entry(folder),
                "power_number", "5", "correlation x", "one of them");
        assertRefused(Sheet.good().with("shear_rate_constant", "5").with("shear_rate_correlation", "x").entry(folder),
                "shear_rate_constant", "5", "shear_rate_correlation x");
        assertRefused(Sheet.good().with("flow_number", "5").with("flow_number_correlation", "x").entry(folder),
                "flow_number", "5", "flow_number_correlation x");
    }

    @Test
    void refusalsOfTheCoreShowWhatWasTyped() {
        CaseResult result = Sheet.good().with("impeller_diameter_m", "1.50000000").entry(folder).check(Invented.CROSS_CHECK);
        assertEquals("impeller_diameter_m", result.refusal().orElseThrow().field());
        assertEquals("1.50000000", result.refusal().orElseThrow().value());
    }
}
