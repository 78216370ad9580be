package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import stirwright.exchange.CurveQuantity;
import stirwright.exchange.CurveSeparator;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.RawRow.Kind;
import stirwright.exchange.internal.table.Numbers;
import stirwright.exchange.internal.table.SourceRow;

/**
 * Tables whose columns have no names that are known. Without any words above the numbers, a shear rate and a stress are the
 * first two columns that hold numbers; words that name neither are not overruled by where a column stands.
 *
 * @param problem why that cannot be said here; empty when it can
 */
record Nameless(SheetSorter sorter, boolean set, String problem) {

    /** Sorts the rows when two columns hold numbers. */
    static Nameless sort(String sheet, ImportChoice choice, HeaderCells cells, List<WorkRow> rows, CurveSeparator separator) {
        SheetSorter sorter = new SheetSorter(sheet, choice, cells, rows);
        List<WorkRow> filled = new ArrayList<>();
        for (WorkRow row : rows) {
            if (row.kind != Kind.BLANK && !row.row.cell(0).startsWith("#")) {
                filled.add(row);
            }
        }
        int first = firstNumbers(filled);
        if (first < 0) {
            return new Nameless(sorter, false, "no row holds two numbers; a shear rate and a shear stress are expected");
        }
        SetHeads heads = new SetHeads();
        boolean set = first > 0 && heads.read(filled.get(first - 1).row, true).isPresent();
        WorkRow above = set ? null : header(filled, first);
        boolean headed = above != null;
        SourceRow names = headed ? above.row : new SourceRow(0, List.of(), null);
        SourceRow numbers = filled.get(first).row;
        if (!choice.columns().isEmpty()) {
            Layout chosen = new LayoutBuilder(sheet, choice, cells).build(names, null, null);
            return sorted(sorter, chosen, above, set ? heads : null);
        }
        if (headed) {
            int at = filled.indexOf(above);
            WorkRow before = at > 0 && above.row.cells().stream().anyMatch(c -> UnitWords.telling(LayoutBuilder.inside(c)).isPresent())
                    ? filled.get(at - 1) : null;
            boolean units = before != null && SheetSorter.noNumbers(before.row) && before.row.filled() > 1;
            Layout told = units ? new LayoutBuilder(sheet, choice, cells).build(before.row, above.row, null)
                    : new LayoutBuilder(sheet, choice, cells).build(names, null, null);
            if (units) {
                before.kind = Kind.NAMES;
            }
            if (told.groups().isEmpty()) {
                above.kind = Kind.NAMES;
                sorter.layouts.add(told);
                return new Nameless(sorter, false, "");
            }
            return sorted(sorter, told, above, null);
        }
        if (separator == CurveSeparator.COMMA && numbers.cells().size() > 2 && noPoint(filled)) {
            return new Nameless(sorter, false, "line " + numbers.line() + " has " + numbers.cells().size()
                    + " cells between commas and no decimal point, so commas may be decimal signs; name the columns in a header,"
                    + " choose the columns, or use another separator");
        }
        boolean plain = set || numbers.filled() == 2;
        return sorted(sorter, byPosition(numbers, plain), null, set ? heads : null);
    }

    /** The last row of several words above the first numbers, or the row of these numbers if words stand over other numbers. */
    private static WorkRow header(List<WorkRow> filled, int first) {
        WorkRow row = filled.get(first);
        for (int i = 0; first + 1 < filled.size() && i < row.row.cells().size(); i++) {
            SourceRow below = filled.get(first + 1).row;
            String cell = row.row.cell(i);
            if (!row.row.isTyped(i) && cell.chars().anyMatch(Character::isLetter) && !Numbers.isNumber(cell)
                    && !Character.isDigit(cell.charAt(0)) && (below.isTyped(i) || Numbers.isNumber(below.cell(i))) && i == firstFilled(row.row)) {
                return row;
            }
        }
        for (int i = first - 1; i >= 0; i--) {
            if (SheetSorter.noNumbers(filled.get(i).row) && filled.get(i).row.filled() > 1) {
                return filled.get(i);
            }
        }
        return null;
    }

    private static int firstFilled(SourceRow row) {
        int at = 0;
        while (row.cell(at).isEmpty()) {
            at++;
        }
        return at;
    }

    private static Nameless sorted(SheetSorter sorter, Layout layout, WorkRow names, SetHeads heads) {
        if (names != null) {
            names.kind = Kind.NAMES;
        }
        sorter.sort(layout, heads);
        return new Nameless(sorter, heads != null, "");
    }

    /** The first row with two numbers; the head of a set has two as well, but a name between them. */
    private static int firstNumbers(List<WorkRow> filled) {
        for (int i = 0; i < filled.size(); i++) {
            SourceRow row = filled.get(i).row;
            boolean head = row.filled() == 3 && Numbers.isNumber(row.cell(0)) && !Numbers.isNumber(row.cell(1))
                    && i + 1 < filled.size() && filled.get(i + 1).row.filled() == 2;
            if (!head && numbers(row).size() > 1) {
                return i;
            }
        }
        return -1;
    }

    private static List<Integer> numbers(SourceRow row) {
        List<Integer> numbers = new ArrayList<>();
        for (int i = 0; i < row.cells().size() && numbers.size() < 2; i++) {
            if (row.isTyped(i) || Numbers.isNumber(row.cell(i))) {
                numbers.add(i);
            }
        }
        return numbers;
    }

    private static boolean noPoint(List<WorkRow> rows) {
        return rows.stream().flatMap(r -> r.row.cells().stream()).noneMatch(c -> c.indexOf('.') >= 0 && Numbers.isNumber(c));
    }

    private static Layout byPosition(SourceRow numbers, boolean plain) {
        List<Integer> at = numbers(numbers);
        Map<CurveQuantity, Column> columns = new EnumMap<>(CurveQuantity.class);
        for (int i = 0; i < 2; i++) {
            CurveQuantity quantity = i == 0 ? CurveQuantity.SHEAR_RATE : CurveQuantity.SHEAR_STRESS;
            columns.put(quantity, new Column(at.get(i), "", quantity, UnitWords.own(quantity),
                    "no name says so: it is the " + (i == 0 ? "first" : "second") + " column with numbers; no unit stands there, "
                            + quantity.unit() + " is assumed"));
        }
        return new Layout(0, List.of(Group.of(1, "", columns)), numbers.cells().size(), List.of(), List.of(), plain ? List.of() : List.of(
                "no column has a name, and column " + (at.get(0) + 1) + " was taken for a shear rate in 1/s and column " + (at.get(1) + 1)
                        + " for a shear stress in Pa, since they are the first two with numbers; write names above, or choose the columns"));
    }
}
