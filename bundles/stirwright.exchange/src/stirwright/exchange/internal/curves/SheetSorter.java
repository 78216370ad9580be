package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import stirwright.exchange.CurveQuantity;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.RawRow.Kind;
import stirwright.exchange.internal.curves.Stretch.Heads;
import stirwright.exchange.internal.table.Numbers;
import stirwright.exchange.internal.table.SourceRow;
import stirwright.exchange.internal.table.Texts;

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
    /** A line of words that heads what follows, if points do. */
    private WorkRow pending;
    private boolean titled = true;
    private boolean gap;
    /** Names of columns that are not read. */
    final Set<String> unread = new LinkedHashSet<>();

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
            if (row.kind == Kind.BLANK || UnitRows.isRule(row.row)) {
                gap |= row.kind == Kind.BLANK;
                continue;
            }
            boolean words = noNumbers(row.row);
            if (words && unitsMayFollow && new UnitRows(headers, names).isUnits(row.row)) {
                row.kind = Kind.UNITS;
                if (!row.row.cells().equals(units)) {
                    units = row.row.cells();
                    relayout(new LayoutBuilder(sheet, choice, headers).build(names, row.row, above));
                }
                unitsMayFollow = false;
            } else if ((words || mayName(row.row)) && headers.areNames(row.row)) {
                takeNames(i);
            } else if (words && names != null && new UnitRows(headers, names).isOther(row.row)) {
                row.kind = Kind.UNITS;
                SourceRow now = new SourceRow(row.row.line(), goingOn(row.row), null);
                if (!now.cells().equals(units)) {
                    units = now.cells();
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
        titled = set == null;
        boolean blankBefore = true;
        int lineBefore = 0;
        for (WorkRow row : rows) {
            boolean apart = blankBefore || row.row.line() > lineBefore + 1;
            lineBefore = row.row.line();
            blankBefore = row.kind == Kind.BLANK;
            gap |= blankBefore;
            if (row.kind == Kind.NAMES) {
                noteUnread(row.row, fixed);
            }
            if (blankBefore || row.kind == Kind.NAMES) {
                continue;
            }
            Optional<Heads> head = set == null ? Optional.empty() : set.read(row.row, apart);
            if (head.isPresent()) {
                row.kind = Kind.BLOCK;
                close(head.get());
            } else {
                if (set != null && apart && open.length > 0 && open[0] != null) {
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
        } else if (pending != null && (pending == before || !stretches.isEmpty())) {
            promote();
        }
        pending = null;
        close(heads);
        use(found);
        noteUnread(names, found);
    }

    private void noteUnread(SourceRow header, Layout found) {
        Set<Integer> read = new HashSet<>();
        found.groups().forEach(g -> g.columns().values().forEach(c -> read.add(c.position())));
        for (int i = 0; i < header.cells().size(); i++) {
            if (!header.cell(i).isEmpty() && !read.contains(i)) {
                unread.add("column " + (i + 1) + " '" + Texts.show(header.cell(i)) + "'");
            }
        }
    }

    /** The line of words is the head of what follows; an interval's name above it ends there. */
    private void promote() {
        pending.kind = Kind.BLOCK;
        headsBefore = heads;
        Heads next = new Heads("", heads.sample(), "", "", HeadWords.words(pending.row));
        pending = null;
        close(next);
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
            if (pending != null && !stretches.isEmpty()) {
                promote();
                head = HeadWords.read(row.row, heads);
            }
            pending = null;
            row.kind = Kind.BLOCK;
            headsBefore = heads;
            close(head.get());
        } else if (titled && HeadWords.isTitle(row.row, firstColumn())
                && (headers.read(HeadWords.words(row.row)).isEmpty() || NameWords.temperatureAlone(HeadWords.words(row.row)))) {
            pending = row;
        } else if (layout != null && takePoints(row)) {
            unitsMayFollow = false;
        }
    }

    private int firstColumn() {
        return layout == null ? Integer.MAX_VALUE : layout.groups().stream().flatMap(g -> g.main().stream())
                .mapToInt(Column::position).min().orElse(Integer.MAX_VALUE);
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
                if (pending != null) {
                    promote();
                }
                if (open[i] == null) {
                    open[i] = new Stretch(layout, group, sheet, heads, names);
                    stretches.add(open[i]);
                }
                open[i].rows.add(row);
                row.points++;
                row.kind = Kind.POINT;
            }
        }
        if (row.points > 0) {
            row.gap = gap;
            gap = false;
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
}
