package stirwright.workbench.tests;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import stirwright.core.CaseResult;
import stirwright.core.Catalogue;
import stirwright.core.CrossCheck;
import stirwright.exchange.CaseEntry;
import stirwright.exchange.CaseTable;
import stirwright.exchange.Origin;
import stirwright.exchange.Output;
import stirwright.exchange.Outputs;

/** What the command line writes for a study: by the calls that it makes itself, read back from its result file. */
final class Console {

    private Console() {}

    /** The rows of one case in the CSV of {@code crosscheck STUDY --out FILE}, each by the names of its columns. */
    static List<Map<String, String>> rows(Path study, String caseName, Catalogue catalogue) throws Exception {
        Path csv = Files.createTempDirectory("console").resolve("results.csv");
        CaseTable table = CaseTable.read(study, catalogue);
        CrossCheck crossCheck = new CrossCheck(catalogue);
        try (Output<CaseResult> out = new Outputs(new Origin("test", table.fileName()), List.of(study)).results(csv)) {
            for (CaseEntry entry : table.entries()) {
                out.add(entry.check(crossCheck));
            }
            out.finish();
        }
        List<List<String>> lines = Files.readAllLines(csv).stream().map(Console::cells).toList();
        List<Map<String, String>> rows = new ArrayList<>();
        for (List<String> line : lines.subList(1, lines.size())) {
            Map<String, String> row = new HashMap<>();
            for (int i = 0; i < line.size(); i++) {
                row.put(lines.get(0).get(i), line.get(i));
            }
            if (row.get("case").equals(caseName)) {
                rows.add(row);
            }
        }
        return rows;
    }

    /** The cells of a line; none of these holds a line break. */
    private static List<String> cells(String line) {
        List<String> cells = new ArrayList<>();
        StringBuilder cell = new StringBuilder();
        boolean quoted = false;
        for (char c : line.toCharArray()) {
            if (c == '"') {
                quoted = !quoted;
            } else if (c == ',' && !quoted) {
                cells.add(cell.toString());
                cell.setLength(0);
            } else {
                cell.append(c);
            }
        }
        cells.add(cell.toString());
        return cells;
    }
}
