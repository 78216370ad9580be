package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import stirwright.exchange.internal.cases.CaseColumns;
import stirwright.rheology.ModelKind;

/** The page that users read and the columns that the code knows are one fact in two places. */
class HelpPageTest {
    private static final Pattern BACKTICKED = Pattern.compile("`([^`]+)`");

    private static String page;

    @BeforeAll
    static void readPage() throws IOException {
        page = Files.readString(Path.of("..", "stirwright.console", "help", "tables.md"));
    }

    private static String section(String heading) {
        int from = page.indexOf("\n" + heading + "\n");
        assertFalse(from < 0, () -> "no section " + heading);
        int to = page.indexOf("\n#", from + 2);
        return page.substring(from, to < 0 ? page.length() : to);
    }

    /** What stands in backticks in the first cell of a section's table rows. */
    private static Set<String> firstCells(String heading) {
        Set<String> names = new TreeSet<>();
        section(heading).lines().filter(l -> l.startsWith("| `")).forEach(l -> {
            Matcher matcher = BACKTICKED.matcher(l.substring(0, l.indexOf('|', 1)));
            while (matcher.find()) {
                names.add(matcher.group(1));
            }
        });
        return names;
    }

    /** The names in a section's fenced block. */
    private static List<String> block(String heading) {
        return List.of(section(heading).split("```")[1].strip().split(", "));
    }

    @Test
    void caseTable() {
        assertEquals(new TreeSet<>(CaseColumns.ofContract()), firstCells("## Case table"));
    }

    @Test
    void models() {
        assertEquals(Arrays.stream(ModelKind.values()).map(ModelKind::id).collect(Collectors.toCollection(TreeSet::new)),
                firstCells("### Models"));
    }

    @Test
    void results() {
        assertEquals(ResultTable.columns(), block("## Result table"));
        assertEquals(CandidateTable.columns(), block("## Candidate table"));
        assertEquals(CatalogueTable.columns(), block("## List of correlations"));
        assertEquals(FitTable.columns(), block("## Fit table"));
    }
}
