package stirwright.exchange.internal.curves;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import stirwright.exchange.CurveQuantity;
import stirwright.exchange.internal.table.Numbers;
import stirwright.exchange.internal.table.SourceRow;

/** What names of columns say, each read once: a file repeats its header for every block. */
final class HeaderCells {
    /** No file has more names; a damaged one might have nothing but. */
    private static final int MOST = 10_000;

    private final Map<String, Optional<HeaderCell>> read = new HashMap<>();
    private final Map<String, Optional<HeaderCell>> byUnit = new HashMap<>();

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

    /** What the unit says where no name does; see {@link HeaderCell#byUnit}. */
    Optional<HeaderCell> byUnit(String cell, String below) {
        if (!below.isEmpty()) {
            return HeaderCell.byUnit(cell, below);
        }
        Optional<HeaderCell> before = byUnit.get(cell);
        if (before != null) {
            return before;
        }
        Optional<HeaderCell> now = HeaderCell.byUnit(cell, "");
        if (byUnit.size() < MOST) {
            byUnit.put(cell, now);
        }
        return now;
    }

    /**
     * At least two names that are known, or told by their unit, one of them of a shear rate, a stress or a viscosity; or one
     * such name with numbers beside it and nothing else, which are names of samples then.
     */
    boolean areNames(SourceRow row) {
        int known = 0;
        int words = 0;
        int numbers = 0;
        boolean main = false;
        for (int i = 0; i < row.cells().size(); i++) {
            String cell = row.cell(i);
            if (cell.isEmpty()) {
                continue;
            }
            if (row.isTyped(i) || !named(cell)) {
                numbers++;
                continue;
            }
            words++;
            Optional<HeaderCell> name = read(cell);
            boolean told = name.isEmpty() && byUnit(cell, "").isPresent();
            known += name.isPresent() || told ? 1 : 0;
            main |= told || name.filter(n -> n.quantity() == CurveQuantity.SHEAR_RATE || n.quantity() == CurveQuantity.SHEAR_STRESS
                    || n.quantity() == CurveQuantity.VISCOSITY).isPresent();
        }
        return main && (known > 1 || words == 1 && numbers > 0);
    }

    /** A number, also a damaged one, names nothing. */
    private static boolean named(String cell) {
        char first = cell.charAt(0);
        return !(first >= '0' && first <= '9' || cell.length() > 1 && "+-.,\u2212".indexOf(first) >= 0) || !Numbers.isNumber(cell);
    }
}
