package stirwright.exchange.internal.curves;

import stirwright.exchange.RawRow;
import stirwright.exchange.internal.table.Numbers;
import stirwright.exchange.internal.table.SourceRow;

/** A row while it is found out what it is. */
final class WorkRow {
    final String sheet;
    final SourceRow row;
    RawRow.Kind kind = RawRow.Kind.NOTE;
    int block;
    /** Whether a blank row stands between it and the point before. */
    boolean gap;
    /** How many points it holds. */
    int points;

    WorkRow(String sheet, SourceRow row) {
        this.sheet = sheet;
        this.row = row;
        forget();
    }

    /** As before anything was found out. */
    void forget() {
        kind = row.blank() ? RawRow.Kind.BLANK : RawRow.Kind.NOTE;
        points = 0;
        gap = false;
        block = 0;
    }

    /** How many cells are numbers. */
    int numbers() {
        int count = 0;
        for (int i = 0; i < row.cells().size(); i++) {
            count += row.isTyped(i) || Numbers.isNumber(row.cell(i)) ? 1 : 0;
        }
        return count;
    }

    RawRow shown() {
        return new RawRow(sheet, row.line(), row.cells(), kind, block);
    }
}
