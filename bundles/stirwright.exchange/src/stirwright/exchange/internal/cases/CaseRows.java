package stirwright.exchange.internal.cases;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import stirwright.core.Catalogue;
import stirwright.exchange.UnusableFileException;
import stirwright.exchange.internal.table.Grid;
import stirwright.exchange.internal.table.TextFile;

/**
 * The rows of a text table of cases.
 *
 * @param reader turns them into cases
 * @param messages what was found out about the file, a line each
 */
public record CaseRows(Grid grid, CaseReader reader, List<String> messages) {

    /** @throws UnusableFileException when the file is no case table */
    public static CaseRows open(TextFile file, Catalogue catalogue) {
        CaseColumns columns = new CaseColumns(catalogue);
        Grid grid = Grid.read(file, columns::isKnown, columns::showsDecimals);
        HeaderChecks checks = new HeaderChecks(file, grid.header(), columns);
        checks.require();
        List<String> messages = new ArrayList<>(grid.messages());
        messages.addAll(checks.messages());
        if (grid.rows().isEmpty()) {
            throw new UnusableFileException(file.path(),
                    "has a header and no case; write one row for each case");
        }
        List<String> dimensions = columns.dimensions().stream().filter(grid.header()::has).toList();
        return new CaseRows(grid, new CaseReader(catalogue, dimensions), List.copyOf(messages));
    }

    /** The rows' cells, in the file's order. */
    public Stream<Cells> cells() {
        return grid.rows().stream().map(row -> new Cells(grid.header(), row, grid.decimal(), "line " + row.line()));
    }
}
