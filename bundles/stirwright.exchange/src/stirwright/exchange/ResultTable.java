package stirwright.exchange;

import java.io.Writer;
import java.util.List;
import stirwright.core.CaseResult;
import stirwright.exchange.internal.write.Column;
import stirwright.exchange.internal.write.ResultColumns;
import stirwright.exchange.internal.write.TableOutput;

/**
 * The result table as CSV: one row a case and power-number candidate, one for a refused case. An
 * empty cell means that there is no meaningful value.
 */
public final class ResultTable {

    private ResultTable() {}

    /** Starts a table; the writer is flushed at the end and left open. */
    public static Output<CaseResult> to(Writer out) {
        return new TableOutput<>(out, ResultColumns.ALL, ResultColumns::rows);
    }

    /** Writes a whole table; the writer is left open. */
    public static void write(Iterable<CaseResult> results, Writer out) {
        try (Output<CaseResult> table = to(out)) {
            results.forEach(table::add);
            table.finish();
        }
    }

    /** The names of the columns, in order. */
    public static List<String> columns() {
        return Column.names(ResultColumns.ALL);
    }
}
