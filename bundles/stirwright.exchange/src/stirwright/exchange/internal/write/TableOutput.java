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
    private final List<Cells<R>> columns;
    private final Function<T, List<R>> rows;

    /** The cells of a column, one after the other; most numbers of a case are the same in each of its rows. */
    private static final class Cells<R> {
        private final Column<R> column;
        private double last = Double.NaN;
        private String lastCell = "";

        Cells(Column<R> column) {
            this.column = column;
        }

        String of(R row) {
            if (!(column instanceof Column.Number<R> number)) {
                return column.cell(row);
            }
            double value = number.of().applyAsDouble(row);
            if (Double.doubleToLongBits(value) != Double.doubleToLongBits(last)) {
                last = value;
                lastCell = number.cell(value);
            }
            return lastCell;
        }
    }

    public TableOutput(Writer out, List<Column<R>> columns, Function<T, List<R>> rows) {
        this.csv = CsvWriter.builder().lineDelimiter(LineDelimiter.LF).build(out);
        this.columns = columns.stream().map(Cells::new).toList();
        this.rows = rows;
        csv.writeRecord(Column.names(columns));
    }

    @Override
    public void add(T item) {
        for (R row : rows.apply(item)) {
            CsvWriter.CsvWriterRecord line = csv.writeRecord();
            columns.forEach(c -> line.writeField(c.of(row)));
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
