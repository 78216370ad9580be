package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static stirwright.exchange.Refusals.assertAccepted;
import static stirwright.exchange.Refusals.assertRefused;
import static stirwright.exchange.Refusals.assertUnusable;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Whatever a row looks like, it refuses itself alone and says on which line it stands. */
class RowShapeTest {
    private static final String LONG = "x".repeat(10_000_000);

    @TempDir
    Path folder;

    private static String row(String name) {
        return Sheet.good().with("case", name).row() + "\n";
    }

    private CaseTable read(String... rows) {
        return Sheet.read(folder, Sheet.good().with("note", "").header() + "\n" + String.join("", rows));
    }

    private static List<String> accepted(CaseTable table) {
        return table.entries().stream().filter(e -> e.spec().isPresent()).map(CaseEntry::name).toList();
    }

    @Test
    void commentsBlankLinesAndLineEnds() {
        CaseTable table = Sheet.read(folder, "# first\r\n\r\n" + Sheet.good().header() + "\r\n#A,\"unclosed\r\n"
                + row("A").strip() + "\r" + ",,,,,,,,\r\n \r\n" + row("B"));
        assertEquals(List.of("A", "B"), accepted(table));
        assertEquals(2, table.entries().size());
        assertEquals(List.of(5, 8), table.entries().stream().map(CaseEntry::line).toList());
    }

    @Test
    void tooManyCells() {
        CaseTable table = read(row("A").strip() + ",note,stray\n", row("B"));
        assertRefused(table.entries().get(0), "column 11", "stray", "11 cells", "header 10", "line 2");
        assertEquals("A", table.entries().get(0).name());
        assertEquals(List.of("B"), accepted(table));
    }

    @Test
    void missingCellsAreBlank() {
        assertAccepted(read(row("A")).entries().get(0));
        assertRefused(read("B,blades,0.5,1.5,4,2\n").entries().get(0), "model", "", "blank");
    }

    @Test
    void unclosedQuote() {
        CaseTable table = read(row("A"), "B,blades,\"0.5,1.5,4,2,1000,newtonian,0.1\n", row("C"), row("D"));
        assertRefused(table.entries().get(1), "impeller_diameter_m", "", "quote", "line 3");
        assertEquals("B", table.entries().get(1).name());
        assertEquals(List.of("A", "C", "D"), accepted(table));
    }

    @Test
    void quoteThatTheNextQuoteSeemsToClose() {
        CaseTable table = read(row("A"), "B,\"blades,0.5,1.5,4,2,1000,newtonian,0.1\n", row("C"),
                row("D").replace("blades", "\"blades\""), row("E"));
        assertRefused(table.entries().get(1), "family", "", "quote", "line 3");
        assertEquals(List.of("A", "C", "D", "E"), accepted(table));
    }

    @Test
    void quoteThatALaterLineCloses() {
        CaseTable table = read("B,\"blades,0.5,1.5,4,2,1000,newtonian,0.1\n", row("C"), "\",x\n", row("D"));
        assertEquals("family", table.entries().get(0).refusal().orElseThrow().field());
        assertTrue(table.entries().get(0).refusal().orElseThrow().reason().contains("line 2"));
        assertEquals(List.of("C", "D"), accepted(table));
    }

    @Test
    void ignoredCellsMaySpanLines() {
        CaseTable table = read(row("A").strip() + ",\"two\nlines, \"\"quoted\"\"\"\n", row("B"));
        assertEquals(List.of("A", "B"), accepted(table));
        assertEquals(4, table.entries().get(1).line());
    }

    @ParameterizedTest
    @ValueSource(strings = {"\n", "\r\n", "\r"})
    void linesAreCountedAlikeWhateverTheirEnd(String lineEnd) {
        CaseTable table = Sheet.read(folder, (Sheet.good().with("note", "").header() + "\n# c\n" + row("A").strip()
                + ",\"two\n\nlines\"\nB,\"blades\n" + row("C")).replace("\n", lineEnd));
        assertEquals(List.of(3, 6, 7), table.entries().stream().map(CaseEntry::line).toList());
        assertRefused(table.entries().get(1), "family", "", "quote", "line 6");
        assertEquals(List.of("A", "C"), accepted(table));
    }

    @ParameterizedTest
    @ValueSource(strings = {"case", "family", "speed_rev_s", "model", "note"})
    void tenMegabytesInACell(String column) {
        String quoted = Sheet.good().with("note", "").with(column, "\"" + LONG + "\"").row() + "\n";
        String plain = Sheet.good().with("note", "").with(column, LONG).row() + "\n";
        String shown = "x".repeat(39) + "…";
        CaseTable table = read(row("A"), quoted, row("B"), plain, row("C"));
        assertRefused(table.entries().get(1), column, shown, "10000000 characters", "line 3");
        assertRefused(table.entries().get(3), column, shown, "10000000 characters", "line 5");
        assertEquals(List.of("A", "B", "C"), accepted(table));
    }

    @Test
    void aCellOfElevenThousandCharactersShowsItsBeginning() {
        CaseTable table = read(Sheet.good().with("model", "y".repeat(11_000)).row() + "\n", row("B"));
        assertRefused(table.entries().get(0), "model", "y".repeat(39) + "…", "11000 characters", "line 2");
        assertEquals(List.of("B"), accepted(table));
    }

    @Test
    void aCellBeyondEveryBuffer() {
        String endless = Sheet.good().with("note", "").with("model", LONG + LONG).row() + "\n";
        CaseTable table = read(row("A"), endless, row("B"));
        assertRefused(table.entries().get(1), "model", "", "characters", "line 3");
        assertEquals(List.of("A", "B"), accepted(table));
    }

    @Test
    void aLongRemarkOfManyLinesCostsItsRowAlone() {
        CaseTable table = read(row("A"), row("B").strip() + ",\"" + "one more line\n".repeat(700_000) + "\"\n", row("C"));
        assertRefused(table.entries().get(1), "note", "one more line one more line one more li…", "9800000", "line 3");
        assertEquals(List.of("A", "C"), accepted(table));
        assertEquals(3, table.entries().size());
    }

    @Test
    void aLongCellOfManyLinesMayHoldRows() {
        String swallowed = row("C").repeat(1) + "# fill\n".repeat(3000);
        CaseTable table = read(row("A"), "B,\"blades,0.5\n", swallowed, "\",1.5\n", row("D"));
        assertRefused(table.entries().get(1), "family", "blades,0.5 C,blades,0.5,1.5,4,2,1000,ne…", "characters", "line 3");
        assertEquals(List.of("A", "C", "D"), accepted(table));
    }

    @Test
    void tenMegabytesInAComment() {
        assertEquals(List.of("A", "B"), accepted(read(row("A"), "#" + LONG + "\n", row("B"), "#" + LONG)));
        assertEquals(List.of("A"), accepted(Sheet.read(folder, "#" + LONG + "\n" + Sheet.good().text())));
        CaseTable beyondEveryBuffer = read(row("A"), "#" + LONG + LONG + "\n", row("B"));
        assertEquals(List.of("A", "B"), accepted(beyondEveryBuffer));
        assertEquals(2, beyondEveryBuffer.entries().size());
    }

    @Test
    void millionsOfCells() {
        CaseTable table = read(row("A").strip() + ",".repeat(5_000_000) + "z\n", row("B"));
        assertTrue(table.entries().get(0).refusal().orElseThrow().reason().contains("line 2"));
        assertEquals(List.of("B"), accepted(table));
    }

    @Test
    void tenMegabytesInTheHeader() {
        assertUnusable(() -> Sheet.read(folder, LONG + Sheet.good().text()), "cases.csv", "line 1", "characters");
    }
}
