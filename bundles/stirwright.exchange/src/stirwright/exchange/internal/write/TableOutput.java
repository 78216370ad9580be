package stirwright.exchange.internal.write;

import de.siegmar.fastcsv.writer.CsvWriter;
import de.siegmar.fastcsv.writer.LineDelimiter;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.util.List;
import java.util.function.Function;
import stirwright.exchange.Output;

/**
 * A CSV table for scripts: comma, decimal point, one header line, {@code \n}.
 *
 * @param <T> what is added
 * @param <R> what a row is made from
 */
public final class TableOutput<T, R> implements Output<T> {
    private final CsvWriter csv;
    private final List<Column<R>> columns;
    private final Function<T, List<R>> rows;

    public TableOutput(Writer out, List<Column<R>> columns, Function<T, List<R>> rows) {
        this.csv = CsvWriter.builder().lineDelimiter(LineDelimiter.LF).build(out);
        this.columns = columns;
        this.rows = rows;
        csv.writeRecord(Column.names(columns));
    }

    @Override
    public void add(T item) {
        for (R row : rows.apply(item)) {
            CsvWriter.CsvWriterRecord line = csv.writeRecord();
            columns.forEach(c -> line.writeField(c.cell(row)));
            line.endRecord();
        }
    }

    @Override
    public void finish() {
        try {
            csv.flush();
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
    }

    @Override
    public void close() {
        // The writer belongs to whoever handed it over.
    }
}
