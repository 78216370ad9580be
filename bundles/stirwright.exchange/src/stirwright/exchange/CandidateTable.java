package stirwright.exchange;

import java.io.Writer;
import java.util.List;
import stirwright.core.CaseResult;
import stirwright.exchange.internal.write.Column;
import stirwright.exchange.internal.write.QuantityColumns;
import stirwright.exchange.internal.write.TableOutput;

/** The candidate table as CSV: one row a case, quantity and correlation; none for a refused case. */
public final class CandidateTable {

    private CandidateTable() {}

    /** Starts a table; the writer is flushed at the end and left open. */
    public static Output<CaseResult> to(Writer out) {
        return new TableOutput<>(out, QuantityColumns.ALL, QuantityColumns::rows);
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
        return Column.names(QuantityColumns.ALL);
    }
}
