package stirwright.exchange.internal.curves;

import java.util.Optional;
import stirwright.exchange.CurveQuantity;
import stirwright.exchange.internal.table.SourceRow;

/** Tells rows of units, and lines that are drawn, by the names above them. */
record UnitRows(HeaderCells headers, SourceRow names) {

    /** A row further down that holds a known unit in the place of a rate, a stress or a viscosity, and no words but units. */
    boolean isOther(SourceRow row) {
        boolean main = false;
        for (int i = 0; i < row.cells().size(); i++) {
            String unit = LayoutBuilder.inside(row.cell(i));
            Optional<CurveQuantity> quantity = headers.read(names.cell(i)).map(HeaderCell::quantity);
            boolean known = quantity.isPresent() && UnitWords.find(quantity.get(), unit).isPresent();
            main |= known && UnitWords.telling(unit).filter(q -> q == quantity.get()).isPresent();
        }
        return main;
    }

    /** A line drawn with signs below a header. */
    static boolean isRule(SourceRow row) {
        for (String cell : row.cells()) {
            if (!cell.isEmpty() && ("-:=".indexOf(cell.charAt(0)) < 0 || cell.length() < 2 || cell.chars().anyMatch(c -> "-:=+".indexOf(c) < 0))) {
                return false;
            }
        }
        return true;
    }

    /** A row below the names with one known unit, or with nothing but brackets. */
    boolean isUnits(SourceRow row) {
        boolean bracketed = true;
        for (int i = 0; i < row.cells().size(); i++) {
            String cell = row.cell(i);
            bracketed &= cell.isEmpty() || cell.startsWith("[") || cell.startsWith("(");
            String unit = LayoutBuilder.inside(cell);
            Optional<CurveQuantity> quantity = headers.read(names.cell(i)).map(HeaderCell::quantity);
            if (!unit.isEmpty() && quantity.isPresent() && (UnitWords.find(quantity.get(), unit).isPresent()
                    || quantity.get() == CurveQuantity.TORQUE && unit.equals("%"))) {
                return true;
            }
        }
        return bracketed;
    }
}
