package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.List;
import stirwright.exchange.UnusableFileException;
import stirwright.exchange.internal.table.Grid;
import stirwright.exchange.internal.table.Numbers;
import stirwright.exchange.internal.table.Row;
import stirwright.exchange.internal.table.TextFile;
import stirwright.exchange.internal.table.Texts;
import stirwright.rheology.FlowCurve;

/** A flow curve from a text table; the first thing that does not fit makes the file unusable. */
public record CurveReader(FlowCurve curve, List<String> messages) {

    /** @throws UnusableFileException naming the line, column and value */
    public static CurveReader read(TextFile file) {
        Row first = Grid.firstRow(file, CurveColumns::isName);
        boolean headed = first.cells().stream().noneMatch(Numbers::isNumber);
        Grid grid = headed ? Grid.read(file, CurveColumns::isName, name -> true) : Grid.readHeadless(file);
        if (grid.rows().isEmpty()) {
            throw new UnusableFileException(file.path(), "has a header and no points");
        }
        CurveColumns columns = CurveColumns.of(grid, headed);
        int count = grid.rows().size();
        double[] rates = new double[count];
        double[] stresses = new double[count];
        for (int i = 0; i < count; i++) {
            Row row = grid.rows().get(i);
            refuseFlaw(grid, row);
            rates[i] = number(grid, row, columns.rate());
            stresses[i] = number(grid, row, columns.stress());
        }
        List<String> messages = new ArrayList<>(grid.messages());
        messages.add(file.name() + ": shear rate in 1/s from " + grid.header().nameAt(columns.rate())
                + ", shear stress in Pa from " + grid.header().nameAt(columns.stress()));
        return new CurveReader(curve(file, rates, stresses), List.copyOf(messages));
    }

    private static FlowCurve curve(TextFile file, double[] rates, double[] stresses) {
        try {
            return FlowCurve.of(rates, stresses);
        } catch (IllegalArgumentException unfit) {
            throw new UnusableFileException(file.path(), unfit.getMessage(), unfit);
        }
    }

    private static void refuseFlaw(Grid grid, Row row) {
        row.flaw().ifPresent(flaw -> {
            throw cannot(grid, row, flaw.cell(), flaw.value(), flaw.reason());
        });
    }

    private static double number(Grid grid, Row row, int column) {
        String text = row.cell(column);
        double value = Numbers.parse(text, grid.decimal());
        if (Double.isNaN(value)) {
            throw cannot(grid, row, column, text, text.isEmpty() ? "is blank" : Numbers.problem(text, grid.decimal()));
        }
        if (value <= 0) {
            throw cannot(grid, row, column, text, "must be greater than 0");
        }
        return value;
    }

    private static UnusableFileException cannot(Grid grid, Row row, int column, String value, String reason) {
        return new UnusableFileException(grid.file().path(), "line " + row.line() + ", "
                + grid.header().nameAt(column) + " '" + Texts.show(value) + "' " + reason);
    }
}
