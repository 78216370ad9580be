package stirwright.exchange.internal.curves;

import java.util.List;
import stirwright.exchange.CurveBlock;
import stirwright.exchange.ImportCounts;
import stirwright.exchange.RawRow.Kind;

/** Counts rows by what they are, and points by what became of them, each by itself. */
final class RowCounts {

    private RowCounts() {}

    static ImportCounts of(List<WorkRow> rows, List<CurveBlock> blocks) {
        int[] kinds = new int[Kind.values().length];
        int beside = 0;
        for (WorkRow row : rows) {
            kinds[row.kind.ordinal()]++;
            beside += Math.max(0, row.points - 1);
        }
        int taken = 0;
        int dropped = 0;
        int left = 0;
        for (CurveBlock block : blocks) {
            int usable = block.usable();
            taken += block.taken() ? usable : 0;
            left += block.taken() ? 0 : usable;
            dropped += block.points().size() - usable;
        }
        return new ImportCounts(rows.size(), beside, taken, dropped, left, kinds[Kind.NAMES.ordinal()] + kinds[Kind.UNITS.ordinal()]
                + kinds[Kind.BLOCK.ordinal()], kinds[Kind.BLANK.ordinal()], kinds[Kind.NOTE.ordinal()]);
    }
}
