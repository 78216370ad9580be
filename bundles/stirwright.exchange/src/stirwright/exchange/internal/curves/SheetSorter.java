package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import stirwright.exchange.CurveQuantity;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.RawRow.Kind;
import stirwright.exchange.internal.curves.Stretch.Heads;
import stirwright.exchange.internal.table.Numbers;
import stirwright.exchange.internal.table.SourceRow;

/** Goes once through the rows of a sheet, says what each is, and gathers the points under their heads. */
final class SheetSorter {
    final List<Layout> layouts = new ArrayList<>();
    final List<Stretch> stretches = new ArrayList<>();
    /** What is wrong with points that were left out, a sentence each. */
    final List<String> problems = new ArrayList<>();

    private final String sheet;
    private final ImportChoice choice;
    private final HeaderCells headers;
    private final List<WorkRow> rows;
    private Layout layout;
    private SourceRow names;
    private List<String> units = List.of();
    private SourceRow above;
    private boolean unitsMayFollow;
    /** The open stretch of each sample. */
    private Stretch[] open = {};
    private Heads heads = Heads.NONE;
    private Heads headsBefore = Heads.NONE;

    SheetSorter(String sheet, ImportChoice choice, HeaderCells headers, List<WorkRow> rows) {
        this.sheet = sheet;
        this.choice = choice;
        this.headers = headers;
        this.rows = rows;
    }

    /** By the names of columns; finds nothing where there are none. */
    void sort() {
        for (int i = 0; i < rows.size(); i++) {
            WorkRow row = rows.get(i);
            if (row.kind == Kind.BLANK || isRule(row.row)) {
                continue;
            }
            boolean words = noNumbers(row.row);
            if (words && unitsMayFollow && isUnits(row.row)) {
                row.kind = Kind.UNITS;
                if (!row.row.cells().equals(units)) {
                    units = row.row.cells();
                    relayout(new LayoutBuilder(sheet, choice, headers).build(names, row.row, above));
                }
                unitsMayFollow = false;
            } else if ((words || mayName(row.row)) && headers.areNames(row.row)) {
                takeNames(i);
            } else if (words && names != null && isOtherUnits(row.row)) {
                row.kind = Kind.UNITS;
                if (!row.row.cells().equals(units)) {
                    SourceRow now = new SourceRow(row.row.line(), goingOn(row.row), null);
                    units = row.row.cells();
                    close(heads);
                    use(new LayoutBuilder(sheet, choice, headers).build(names, now, above));
                }
            } else {
                sortOther(row);
            }
        }
        stretches.removeIf(this::hasOtherUnits);
    }

    private boolean hasOtherUnits(Stretch stretch) {
        Optional<String> problem = UnitColumns.problem(stretch);
        problem.ifPresent(words -> {
            problems.add(words);
            for (WorkRow row : stretch.rows) {
                row.points--;
                row.kind = row.points == 0 ? Kind.NOTE : row.kind;
            }
        });
        return problem.isPresent();
    }

    /** By a layout that is known beforehand, in a set of curves or a table without names. */
    void sort(Layout fixed, SetHeads set) {
        use(fixed);
        boolean blankBefore = true;
        int lineBefore = 0;
        for (WorkRow row : rows) {
            boolean gap = blankBefore || row.row.line() > lineBefore + 1;
            lineBefore = row.row.line();
            blankBefore = row.kind == Kind.BLANK;
            if (blankBefore || row.kind == Kind.NAMES) {
                continue;
            }
            Optional<Heads> head = set == null ? Optional.empty() : set.read(row.row, gap);
            if (head.isPresent()) {
                row.kind = Kind.BLOCK;
                close(head.get());
            } else {
                if (set != null && gap && open.length > 0 && open[0] != null) {
                    close(Heads.NONE);
                }
                sortOther(row);
            }
        }
    }

    private void takeNames(int at) {
        rows.get(at).kind = Kind.NAMES;
        unitsMayFollow = true;
        if (isRepeated(rows.get(at).row)) {
            return;
        }
        names = rows.get(at).row;
        units = List.of();
        above = null;
        WorkRow before = at == 0 ? null : rows.get(at - 1);
        if (before != null && (before.kind == Kind.NOTE || before.kind == Kind.BLOCK)) {
            above = before.row;
        }
        Layout found = new LayoutBuilder(sheet, choice, headers).build(names, toldBeside(at), above);
        if (above != null && found.groups().size() > 1) {
            // What looked like the head of a sample names several that stand side by side.
            heads = before.kind == Kind.BLOCK ? headsBefore : heads;
            before.kind = Kind.NAMES;
        }
        close(heads);
        use(found);
    }

    /** A header that comes again on each page parts nothing as long as points have numbers, which then go on. */
    private boolean isRepeated(SourceRow row) {
        return names != null && row.cells().equals(names.cells()) && layout.groups().size() == 1 && Stream.of(
                CurveQuantity.POINT_NUMBER, CurveQuantity.SEGMENT_AND_POINT).anyMatch(layout.groups().get(0).columns()::containsKey);
    }

    /** Units in columns of their own, as the first row of points has them; null without. */
    private SourceRow toldBeside(int at) {
        for (int i = at + 1; i < Math.min(rows.size(), at + 4); i++) {
            if (rows.get(i).numbers() > 1) {
                return UnitColumns.told(names, rows.get(i).row, headers);
            }
        }
        return null;
    }

    /** A units row further down says nothing of the columns that it leaves blank. */
    private List<String> goingOn(SourceRow row) {
        List<String> all = new ArrayList<>();
        for (int i = 0; i < Math.max(row.cells().size(), units.size()); i++) {
            all.add(!row.cell(i).isEmpty() || i >= units.size() ? row.cell(i) : units.get(i));
        }
        return all;
    }

    private void use(Layout found) {
        layout = found;
        layouts.add(found);
        open = new Stretch[found.groups().size()];
    }

    private void relayout(Layout found) {
        layouts.removeLast();
        use(found);
    }

    private void sortOther(WorkRow row) {
        Optional<Heads> head = HeadWords.read(row.row, heads);
        if (head.isPresent() && !holdsPoint(row.row)) {
            row.kind = Kind.BLOCK;
            headsBefore = heads;
            close(head.get());
        } else if (layout != null && takePoints(row)) {
            unitsMayFollow = false;
        }
    }

    /** A row that begins like a head is a point all the same when it has a rate, or words in two of its places. */
    private boolean holdsPoint(SourceRow row) {
        for (Group group : layout == null ? List.<Group>of() : layout.groups()) {
            int rate = group.column(CurveQuantity.SHEAR_RATE).position();
            long filled = group.main().stream().filter(c -> !row.cell(c.position()).isEmpty()).count();
            if (row.isTyped(rate) || Numbers.isNumber(row.cell(rate)) || filled > 1 && row.filled() > 2) {
                return true;
            }
        }
        return false;
    }

    private void close(Heads next) {
        heads = next;
        open = new Stretch[open.length];
    }

    private boolean takePoints(WorkRow row) {
        for (int i = 0; i < open.length; i++) {
            Group group = layout.groups().get(i);
            if (PointRows.isPoint(row.row, group, open.length == 1)) {
                if (open[i] == null) {
                    open[i] = new Stretch(layout, group, sheet, heads);
                    stretches.add(open[i]);
                }
                open[i].rows.add(row);
                row.points++;
                row.kind = Kind.POINT;
            }
        }
        return row.points > 0;
    }

    static boolean noNumbers(SourceRow row) {
        for (int i = 0; i < row.cells().size(); i++) {
            if (row.isTyped(i) || Numbers.isNumber(row.cell(i))) {
                return false;
            }
        }
        return true;
    }

    /** A row with numbers has names as well when it begins with a word and holds no point. */
    private boolean mayName(SourceRow row) {
        for (String cell : row.cells()) {
            if (!cell.isEmpty()) {
                return !Numbers.isNumber(cell) && cell.chars().anyMatch(Character::isLetter) && !holdsPoint(row);
            }
        }
        return false;
    }

    /** A row further down that holds a known unit in the place of a rate, a stress or a viscosity, and no words but units. */
    private boolean isOtherUnits(SourceRow row) {
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
    private static boolean isRule(SourceRow row) {
        for (String cell : row.cells()) {
            if (!cell.isEmpty() && ("-:=".indexOf(cell.charAt(0)) < 0 || cell.length() < 2 || cell.chars().anyMatch(c -> "-:=+".indexOf(c) < 0))) {
                return false;
            }
        }
        return true;
    }

    private boolean isUnits(SourceRow row) {
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
