package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import stirwright.exchange.BlockUse;
import stirwright.exchange.CurveBlock;
import stirwright.exchange.DroppedPoint;
import stirwright.exchange.ImportMessage;
import stirwright.exchange.ImportMessage.Weight;
import stirwright.exchange.PointPlace;
import stirwright.exchange.RawRow.Kind;

/** Gathers what a reader should see, each line once. */
final class Messages {
    private static final int MOST_NAMED = 5;
    private static final int MOST_UNREAD = 12;
    /** Of more blocks than these only those that are not taken are told. */
    private static final int MOST_BLOCKS = 8;

    private final Set<ImportMessage> all = new LinkedHashSet<>();

    void problem(String words) {
        all.add(new ImportMessage(Weight.PROBLEM, words));
    }

    void warning(String words) {
        all.add(new ImportMessage(Weight.WARNING, words));
    }

    private void note(String words) {
        all.add(new ImportMessage(Weight.NOTE, words));
    }

    List<ImportMessage> list() {
        return List.copyOf(all);
    }

    /** Number and name of a block. */
    static String name(CurveBlock block) {
        List<String> words = new ArrayList<>(List.of(block.name(), block.sheet().isEmpty() ? "" : "sheet '" + block.sheet() + "'",
                block.sample() > 1 ? "sample " + block.sample() : ""));
        words.removeIf(String::isEmpty);
        return block.number() + (words.isEmpty() ? "" : " (" + String.join(", ", words) + ")");
    }

    void blocks(List<CurveBlock> blocks) {
        for (CurveBlock block : blocks) {
            if (!block.taken() || block.use() == BlockUse.UNORDERED || blocks.size() > 1 && blocks.size() <= MOST_BLOCKS) {
                note("block " + name(block) + ": " + block.use().words() + ", " + block.usable() + " of " + block.points().size()
                        + " points, " + (block.taken() ? "taken" : "not taken") + " (" + block.reason() + ")");
            }
            block.warnings().forEach(w -> warning("block " + name(block) + ": " + w));
        }
    }

    /** Names of columns that are not read. */
    void unread(Set<String> columns) {
        if (!columns.isEmpty()) {
            note("not read: " + String.join(", ", columns.stream().limit(MOST_UNREAD).toList())
                    + (columns.size() > MOST_UNREAD ? " and " + (columns.size() - MOST_UNREAD) + " more" : ""));
        }
    }

    /** Rows with numbers that belong to no table may be points whose header is damaged. */
    void outside(List<WorkRow> rows) {
        List<WorkRow> outside = rows.stream().filter(r -> r.kind == Kind.NOTE && r.numbers() > 1).toList();
        if (!outside.isEmpty()) {
            WorkRow first = outside.get(0);
            warning(outside.size() + (outside.size() == 1 ? " row" : " rows") + " with two or more numbers under no header that is known,"
                    + " the first on " + new PointPlace(first.sheet, first.row.line(), 1).words() + ": not read; name the columns if"
                    + " they are points");
        }
    }

    void dropped(List<DroppedPoint> dropped) {
        if (!dropped.isEmpty()) {
            note(dropped.size() + (dropped.size() == 1 ? " point is dropped: " : " points are dropped: ") + named(dropped, MOST_NAMED));
        }
    }

    /** The first few, those of one reason in one. */
    private static String named(List<DroppedPoint> dropped, int most) {
        List<String> named = new ArrayList<>();
        int at = 0;
        while (at < dropped.size() && named.size() < most) {
            DroppedPoint first = dropped.get(at);
            int last = at;
            while (last + 1 < dropped.size() && dropped.get(last + 1).reason().equals(first.reason())
                    && dropped.get(last + 1).block() == first.block()) {
                last++;
            }
            named.add(first.place().words() + (last > at ? " and on to line " + dropped.get(last).place().line() : "") + ", "
                    + first.reason());
            at = last + 1;
        }
        return String.join("; ", named) + (at < dropped.size() ? "; and " + (dropped.size() - at) + " more" : "");
    }

    /** Says why there is no curve, unless something said so already. */
    void none(List<CurveBlock> blocks, List<DroppedPoint> dropped) {
        if (all.stream().anyMatch(m -> m.weight() == Weight.PROBLEM)) {
            return;
        }
        if (blocks.isEmpty()) {
            problem("has a header and no points; a shear rate and a shear stress are expected in each row");
            return;
        }
        CurveBlock best = blocks.stream().reduce((a, b) -> b.usable() > a.usable() ? b : a).orElseThrow();
        problem("holds no flow curve: block " + name(best) + " has the most points that can be used, " + best.usable() + " of "
                + best.points().size() + ", but is " + best.use().words() + ", not taken (" + best.reason() + ")"
                + (dropped.isEmpty() ? "" : "; dropped: " + named(dropped, 1)));
    }
}
