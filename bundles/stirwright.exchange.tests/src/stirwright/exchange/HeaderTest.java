package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static stirwright.exchange.Refusals.assertAccepted;
import static stirwright.exchange.Refusals.assertUnusable;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class HeaderTest {
    @TempDir
    Path folder;

    @ParameterizedTest
    @ValueSource(strings = {"case", "family", "impeller_diameter_m", "density_kg_m3", "model"})
    void requiredColumns(String column) {
        assertUnusable(() -> Sheet.good().without(column).table(folder), "cases.csv", "no column " + column);
    }

    @Test
    void severalMissingColumnsAreNamedAtOnce() {
        assertUnusable(() -> Sheet.good().without("case").without("model").table(folder), "case", "model");
    }

    @Test
    void someSpeedOrTargetIsNeeded() {
        assertUnusable(() -> Sheet.good().without("speed_rev_s").table(folder),
                "speed_rpm", "speed_rev_s", "target_shear_rate_1_s");
    }

    @Test
    void anotherCaseIsHintedAt() {
        assertUnusable(() -> Sheet.good().without("density_kg_m3").with("Density_kg_m3", "1000").table(folder),
                "density_kg_m3", "'Density_kg_m3'");
        List<String> messages = Sheet.good().with("Liquid_height_m", "9").table(folder).messages();
        assertTrue(messages.stream().anyMatch(m -> m.contains("'Liquid_height_m'") && m.contains("'liquid_height_m'")));
    }

    @Test
    void columnThatStandsTwice() {
        String text = Sheet.good().header() + ",model\n" + Sheet.good().row() + ",newtonian\n";
        assertUnusable(() -> Sheet.read(folder, text), "model", "more than once");
    }

    @Test
    void unknownColumnsAreIgnoredByName() {
        CaseTable table = Sheet.good().with("my remark", "abc").with("baffle_kind", "x").table(folder);
        assertAccepted(table.entries().get(0));
        assertEquals(Sheet.good().entry(folder).spec(), table.entries().get(0).spec());
        assertEquals(1, table.messages().stream().filter(m -> m.contains("'my remark'")).count());
        assertEquals(1, table.messages().stream().filter(m -> m.contains("'baffle_kind'")).count());
    }

    @Test
    void columnsWithoutANameAreCounted() {
        CaseTable table = Sheet.read(folder, Sheet.good().header() + ",,\n" + Sheet.good().row() + ",,\n");
        assertAccepted(table.entries().get(0));
        assertTrue(table.messages().stream().anyMatch(m -> m.contains("2 column(s) without a name")));
    }

    @Test
    void namesAreTrimmed() {
        String text = Sheet.good().text().replaceFirst("model", " model ").replaceFirst("case", "\"case\" ");
        assertAccepted(Sheet.read(folder, text).entries().get(0));
    }

    @Test
    void dimensionsOfAnInstalledFamilyAreColumns() {
        CaseEntry entry = Sheet.good().with("twist_deg", "180").entry(folder);
        assertEquals(Math.PI, entry.spec().orElseThrow().geometry().get("twist"));
    }
}
