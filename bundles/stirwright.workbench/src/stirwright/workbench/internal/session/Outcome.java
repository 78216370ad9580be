package stirwright.workbench.internal.session;

import java.util.List;
import java.util.Optional;
import stirwright.chart.Picture;
import stirwright.core.CaseResult;
import stirwright.core.Catalogue;
import stirwright.core.Refusal;
import stirwright.workbench.internal.Messages;

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

    /** What is shown of a study without a case: nothing but the way on. */
    static Outcome withoutCase(Catalogue catalogue, View view) {
        CaseResult none = CaseResult.refused("", "", new Refusal(Messages.Case_none, "", ""));
        return new Outcome(catalogue, new Words(catalogue), view,
                List.of(new Sheet("", "", none, Optional.empty(), Optional.empty())), List.of(), Picture.empty(Messages.Case_none));
    }

    /** The case with its own family. */
    public Sheet main() {
        return sheets.get(0);
    }
}
