package stirwright.exchange.internal.curves;

import stirwright.exchange.internal.table.Numbers;
import stirwright.exchange.internal.table.SourceRow;

/** Tells whether a row holds a point, a damaged one included, so that none goes unseen. */
final class PointRows {

    private PointRows() {}

    /** @param alone whether the table has this one sample only */
    static boolean isPoint(SourceRow row, Group group, boolean alone) {
        int filled = 0;
        int begun = 0;
        for (Column column : group.main()) {
            String cell = row.cell(column.position());
            if (isNumber(row, column.position())) {
                return true;
            }
            filled += cell.isEmpty() ? 0 : 1;
            begun += beginsLikeANumber(cell) ? 1 : 0;
        }
        if (begun > 0) {
            return true;
        }
        if (filled == 0 && !alone) {
            return false;
        }
        if (row.cell(0).startsWith("#")) {
            return false;
        }
        // Words in the place of numbers: a point that the instrument gave up, if anything else in the row is a number.
        for (Column column : group.columns().values()) {
            if (isNumber(row, column.position()) || Numbering.isJoined(row.cell(column.position()), column)) {
                return true;
            }
        }
        return filled > 1;
    }

    private static boolean isNumber(SourceRow row, int position) {
        return row.isTyped(position) || Numbers.isNumber(row.cell(position));
    }

    private static boolean beginsLikeANumber(String cell) {
        return !cell.isEmpty() && (Character.isDigit(cell.charAt(0))
                || cell.length() > 1 && "+-.,<>\u2212".indexOf(cell.charAt(0)) >= 0 && Character.isDigit(cell.charAt(1)));
    }
}
