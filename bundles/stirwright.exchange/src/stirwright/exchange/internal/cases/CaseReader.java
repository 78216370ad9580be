package stirwright.exchange.internal.cases;

import static stirwright.exchange.internal.cases.CaseColumns.CASE;
import static stirwright.exchange.internal.cases.CaseColumns.FAMILY;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import stirwright.core.CaseRefusedException;
import stirwright.core.CaseSpec;
import stirwright.core.Catalogue;
import stirwright.core.Choices;
import stirwright.core.SpeedDemand;
import stirwright.exchange.UnusableFileException;
import stirwright.exchange.internal.table.Grid;
import stirwright.exchange.internal.table.Header;
import stirwright.exchange.internal.table.Row;
import stirwright.exchange.internal.table.TextFile;
import stirwright.exchange.internal.table.Texts;
import stirwright.rheology.Fluid;

/** Turns the rows of a table into cases. */
public final class CaseReader {
    private final Catalogue catalogue;
    private final Grid grid;
    private final List<String> messages;
    private final GeometryCells geometry;
    private final Map<String, Integer> linesByName = new HashMap<>();

    private CaseReader(Catalogue catalogue, Grid grid, CaseColumns columns, List<String> messages) {
        this.catalogue = catalogue;
        this.grid = grid;
        this.messages = messages;
        this.geometry = new GeometryCells(columns.dimensions().stream().filter(grid.header()::has).toList());
    }

    /** @throws UnusableFileException when the file is no case table */
    public static CaseReader open(TextFile file, Catalogue catalogue) {
        CaseColumns columns = new CaseColumns(catalogue);
        Grid grid = Grid.read(file, columns::isKnown, columns::isNumeric);
        HeaderChecks checks = new HeaderChecks(file, grid.header(), columns);
        checks.require();
        List<String> messages = new ArrayList<>(grid.messages());
        messages.addAll(checks.messages());
        if (grid.rows().isEmpty()) {
            throw new UnusableFileException(file.path(),
                    "has a header and no case; write one row for each case");
        }
        return new CaseReader(catalogue, grid, columns, messages);
    }

    public List<String> messages() {
        return messages;
    }

    public List<Row> rows() {
        return grid.rows();
    }

    public Cells cells(Row row) {
        return new Cells(grid.header(), row, grid.decimal());
    }

    /** What to call the case of a row, though the row may be unreadable. */
    public String name(Cells cells) {
        return cells.given(CASE) ? whole(cells, CASE) : "line " + cells.row().line();
    }

    public String family(Cells cells) {
        return whole(cells, FAMILY);
    }

    private static String whole(Cells cells, String column) {
        return cells.row().flaw().isPresent() ? cells.shown(column) : cells.text(column);
    }

    /** @throws CaseRefusedException naming the column and the value as typed */
    public CaseSpec read(Cells cells) {
        refuseFlaw(cells.row());
        String name = requireName(cells);
        String family = cells.text(FAMILY).toLowerCase(Locale.ROOT);
        if (family.isEmpty()) {
            throw cells.refusal(FAMILY, "is blank; give the id of an impeller family");
        }
        List<String> remarks = new ArrayList<>();
        SpeedDemand speed = SpeedCells.read(cells);
        Fluid fluid = FluidCells.read(cells, remarks);
        Choices choices = ChoiceCells.read(cells);
        Map<String, Double> dimensions = catalogue.family(family)
                .map(f -> geometry.read(cells, f, remarks))
                .orElse(Map.of());
        return new CaseSpec(name, family, dimensions, speed, fluid, choices, remarks);
    }

    private void refuseFlaw(Row row) {
        row.flaw().ifPresent(flaw -> {
            Header header = grid.header();
            throw new CaseRefusedException(header.nameAt(flaw.cell()), Texts.show(flaw.value()),
                    flaw.reason() + " (line " + row.line() + ")");
        });
    }

    private String requireName(Cells cells) {
        if (!cells.given(CASE)) {
            throw cells.refusal(CASE, "is blank on line " + cells.row().line() + "; every row needs a name");
        }
        String name = cells.text(CASE);
        Integer first = linesByName.putIfAbsent(name, cells.row().line());
        if (first != null) {
            throw cells.refusal(CASE, "on line " + cells.row().line() + " is the name of the case on line " + first
                    + " too; names are unique in a file");
        }
        return name;
    }
}
