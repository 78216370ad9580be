package stirwright.exchange;

import java.io.Writer;
import java.util.List;
import stirwright.exchange.internal.write.Column;
import stirwright.exchange.internal.write.FitColumns;
import stirwright.exchange.internal.write.TableOutput;

/** The fit table as CSV: one row a curve, model and parameter. */
public final class FitTable {

    private FitTable() {}

    /** Starts a table; the writer is flushed at the end and left open. */
    public static Output<CurveFits> to(Writer out) {
        return new TableOutput<>(out, FitColumns.ALL, FitColumns::rows);
    }

    /** Writes a whole table; the writer is left open. */
    public static void write(Iterable<CurveFits> fits, Writer out) {
        try (Output<CurveFits> table = to(out)) {
            fits.forEach(table::add);
            table.finish();
        }
    }

    /** The names of the columns, in order. */
    public static List<String> columns() {
        return Column.names(FitColumns.ALL);
    }
}
