package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static stirwright.exchange.Refusals.assertAccepted;
import static stirwright.exchange.Refusals.assertRefused;
import static stirwright.exchange.Refusals.assertUnusable;

import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Separator and decimal sign are told apart per file, reported, and never guessed silently. */
class SeparatorTest {
    private static final String HEADER =
            "case;family;impeller_diameter_m;vessel_diameter_m;baffle_count;speed_rev_s;density_kg_m3;model;viscosity_Pa_s\n";

    @TempDir
    Path folder;

    private String message(String text) {
        return Sheet.read(folder, text).messages().get(0);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {"','|comma", "';'|semicolon", "'\t'|tab"})
    void separatorsAreReported(String separator, String word) {
        assertTrue(message(Sheet.good().text().replace(",", separator)).contains(word));
    }

    @Test
    void quotedCellsOfTheHeaderCountAsOne() {
        String text = Sheet.good().text().replace(",", ";").replaceFirst("case", "\"a, b, c, d, e, f, g, h, i, j, k, l\";case")
                .replaceFirst("\nA", "\nx;A");
        assertAccepted(Sheet.read(folder, text).entries().get(0));
        String unquoted = text.replace("\"", "");
        assertAccepted(Sheet.read(folder, unquoted).entries().get(0));
    }

    @Test
    void theSeparatorIsTheOneThatShowsKnownNames() {
        String text = Sheet.good().with("remark; free\t", "").text();
        assertAccepted(Sheet.read(folder, text).entries().get(0));
        assertTrue(message(text).contains("comma as separator"));
    }

    @Test
    void decimalSignsAreReported() {
        assertTrue(message(HEADER + "A;blades;0.5;1.5;4;2;1000;newtonian;0.1\n").contains("decimal point"));
        assertTrue(message(HEADER + "A;blades;0,5;1,5;4;2;1000;newtonian;0,1\n").contains("decimal comma"));
        assertTrue(message(HEADER + "A;blades;1;2;4;2;1000;newtonian;1\n").contains("no decimal sign"));
    }

    @Test
    void theRarerSignRefusesItsRowAlone() {
        CaseTable table = Sheet.read(folder, HEADER + "A;blades;0,5;1,5;4;2;1000;newtonian;0,1\n"
                + "B;blades;0,5;1,5;4;2;1000;newtonian;0.1\nC;blades;0,5;1,5;4;2;1000;newtonian;0,1\n");
        assertAccepted(table.entries().get(0));
        assertRefused(table.entries().get(1), "viscosity_Pa_s", "0.1", "decimal point", "decimal comma");
        assertAccepted(table.entries().get(2));
    }

    @Test
    void aTieRefusesTheFileAndNamesBothCells() {
        String text = HEADER + "A;blades;0,5;2;4;2;1000;newtonian;1\nB;blades;1;2;4;2;1000;newtonian;0.1\n";
        assertUnusable(() -> Sheet.read(folder, text),
                "line 2", "impeller_diameter_m '0,5'", "line 3", "viscosity_Pa_s '0.1'");
    }

    @Test
    void textColumnsHaveNoVote() {
        String text = HEADER + "1.5;blades;0,5;2;4;2;1000;newtonian;1\n2.5;blades;1;2;4;2;1000;newtonian;1\n";
        assertTrue(message(text).contains("decimal comma"));
        assertEquals("1.5", Sheet.read(folder, text).entries().get(0).name());
    }

    @Test
    void betweenCommasADecimalCommaNeedsQuotes() {
        String header = HEADER.replace(';', ',');
        CaseTable table = Sheet.read(folder, header + "A,blades,\"0,5\",\"1,5\",4,2,1000,newtonian,\"0,1\"\n"
                + "B,blades,0,5,1,5,4,2,1000,newtonian,0,1\n");
        assertAccepted(table.entries().get(0));
        assertEquals(0.5, table.entries().get(0).spec().orElseThrow().geometry().get("impeller_diameter"));
        assertRefused(table.entries().get(1), "column 10", "newtonian", "12 cells", "header 9", "quotes");
    }

    @Test
    void anUnquotedDecimalCommaIsSeenThoughTheRowEndsWithBlanks() {
        String header = HEADER.replace(';', ',').replace("\n", ",shear_rate_min_1_s,shear_rate_max_1_s\n");
        assertRefused(Sheet.read(folder, header + "B,blades,0.5,1,5,4,2,1000,newtonian,1,,\n").entries().get(0),
                "column 12", "", "12 cells", "header 11");
    }

    @ParameterizedTest
    @ValueSource(strings = {"1.000,5", "1,000.5", "1.000.000", "1 000", "1'000"})
    void thousandsSeparatorsAreRefused(String density) {
        CaseTable table = Sheet.read(folder, HEADER + "A;blades;0.5;1.5;4;2;" + density + ";newtonian;0.1\n");
        assertRefused(table.entries().get(0), "density_kg_m3", density, "thousands");
    }
}
