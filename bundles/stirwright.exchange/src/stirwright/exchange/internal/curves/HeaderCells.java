package stirwright.exchange.internal.curves;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import stirwright.exchange.CurveQuantity;
import stirwright.exchange.internal.table.SourceRow;

/** What names of columns say, each read once: a file repeats its header for every block. */
final class HeaderCells {
    /** No file has more names; a damaged one might have nothing but. */
    private static final int MOST = 10_000;

    private final Map<String, Optional<HeaderCell>> read = new HashMap<>();

    Optional<HeaderCell> read(String cell) {
        Optional<HeaderCell> before = read.get(cell);
        if (before != null) {
            return before;
        }
        Optional<HeaderCell> now = HeaderCell.read(cell);
        if (read.size() < MOST) {
            read.put(cell, now);
        }
        return now;
    }

    /** At least two names that are known, one of them of a shear rate, a stress or a viscosity. */
    boolean areNames(SourceRow row) {
        int known = 0;
        boolean main = false;
        for (String cell : row.cells()) {
            Optional<HeaderCell> name = cell.isEmpty() ? Optional.empty() : read(cell);
            known += name.isPresent() ? 1 : 0;
            main |= name.filter(n -> n.quantity() == CurveQuantity.SHEAR_RATE || n.quantity() == CurveQuantity.SHEAR_STRESS
                    || n.quantity() == CurveQuantity.VISCOSITY).isPresent();
        }
        return known > 1 && main;
    }
}
