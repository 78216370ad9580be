package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import stirwright.exchange.CurveQuantity;
import stirwright.exchange.internal.table.SourceRow;
import stirwright.exchange.internal.table.Texts;

/** Columns that hold words for units, row by row, to the right of a quantity that has none of its own. */
final class UnitColumns {

    private UnitColumns() {}

    /** The units that a row of points tells, each in the place of its quantity; null when it tells none. */
    static SourceRow told(SourceRow names, SourceRow points, HeaderCells headers) {
        List<String> units = new ArrayList<>();
        boolean any = false;
        for (int i = 0; i < names.cells().size(); i++) {
            Optional<HeaderCell> name = headers.read(names.cell(i)).filter(n -> n.quantity().measured() && n.unit().isEmpty());
            boolean free = headers.read(names.cell(i + 1)).isEmpty();
            String unit = name.isPresent() && free && isUnit(name.get().quantity(), points.cell(i + 1)) ? points.cell(i + 1) : "";
            any |= !unit.isEmpty();
            units.add(unit);
        }
        return any ? new SourceRow(points.line(), units, null) : null;
    }

    /** What is wrong with the units of a stretch of points; empty when each row says what its column says. */
    static Optional<String> problem(Stretch stretch) {
        Set<Integer> read = stretch.layout.groups().stream().flatMap(g -> g.columns().values().stream()).map(Column::position)
                .collect(Collectors.toSet());
        for (Column column : stretch.group.columns().values()) {
            int beside = column.position() + 1;
            if (!column.quantity().measured() || read.contains(beside)) {
                continue;
            }
            for (WorkRow row : stretch.rows) {
                String cell = row.row.cell(beside);
                if (!cell.isEmpty() && isUnit(column.quantity(), cell)
                        && !UnitWords.find(column.quantity(), cell).orElseThrow().same(column.scale())) {
                    return Optional.of("line " + row.row.line() + ": column " + (beside + 1) + " says that " + column.name() + " is in '"
                            + Texts.show(cell) + "' there, but it is read in " + column.scale().unit()
                            + "; none of its points is taken: write one unit throughout, and the same in the header");
                }
            }
        }
        return Optional.empty();
    }

    private static boolean isUnit(CurveQuantity quantity, String cell) {
        return !cell.isEmpty() && Character.isDigit(cell.charAt(cell.length() - 1)) && Character.isDigit(cell.charAt(0)) && cell.indexOf('/') < 0
                ? false : UnitWords.find(quantity, cell).isPresent();
    }
}
