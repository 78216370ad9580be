package stirwright.workbench.internal.session;

import java.util.List;
import stirwright.chart.Picture;
import stirwright.core.Catalogue;

/**
 * All that the window shows for one state of the study. Immutable.
 *
 * @param words turns sentences of the core into those of the window
 * @param sheets the family of the case first, then those compared with it
 * @param rows the candidates of the view, the pick of the case first
 */
public record Outcome(Catalogue catalogue, Words words, View view, List<Sheet> sheets, List<Row> rows, Picture picture) {
    public Outcome {
        sheets = List.copyOf(sheets);
        rows = List.copyOf(rows);
    }

    /** The case with its own family. */
    public Sheet main() {
        return sheets.get(0);
    }
}
