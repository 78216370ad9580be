package stirwright.exchange.internal.curves;

import stirwright.exchange.CurveQuantity;
import stirwright.exchange.internal.table.SourceRow;

/** Point and segment numbers, in cells of their own or joined in one. */
final class Numbering {

    private Numbering() {}

    /** Whether a cell holds both numbers with a sign between them; a decimal sign counts where a header says so. */
    static boolean isJoined(String cell, Column column) {
        boolean said = column.quantity() == CurveQuantity.SEGMENT_AND_POINT;
        if (!said && column.quantity() != CurveQuantity.POINT_NUMBER && column.quantity() != CurveQuantity.SEGMENT_NUMBER) {
            return false;
        }
        int sign = digits(cell, 0);
        int rest = sign;
        while (rest < cell.length() && !Character.isDigit(cell.charAt(rest))) {
            rest++;
        }
        return sign > 0 && rest > sign && rest - sign < 4 && rest < cell.length() && digits(cell, rest) == cell.length()
                && (said || ".,".indexOf(cell.charAt(sign)) < 0);
    }

    /** The number of the segment; empty when the row has none. */
    static String segment(SourceRow row, Group group) {
        for (CurveQuantity kind : new CurveQuantity[] {CurveQuantity.SEGMENT_AND_POINT, CurveQuantity.SEGMENT_NUMBER,
            CurveQuantity.POINT_NUMBER}) {
            Column column = group.column(kind);
            String cell = column == null ? "" : row.cell(column.position());
            if (column != null && isJoined(cell, column)) {
                return cell.substring(0, digits(cell, 0));
            }
            if (column != null && kind == CurveQuantity.SEGMENT_NUMBER) {
                return cell;
            }
        }
        return "";
    }

    /** The number of the point; -1 when the row has none. */
    static int point(SourceRow row, Group group) {
        for (CurveQuantity kind : new CurveQuantity[] {CurveQuantity.SEGMENT_AND_POINT, CurveQuantity.POINT_NUMBER}) {
            Column column = group.column(kind);
            if (column != null) {
                String cell = row.cell(column.position());
                int from = isJoined(cell, column) ? lastNumber(cell) : 0;
                int to = digits(cell, from);
                boolean whole = to > from && to - from < 9 && (to == cell.length() || cell.substring(to).matches("[.,]0*"));
                return whole ? Integer.parseInt(cell.substring(from, to)) : -1;
            }
        }
        return -1;
    }

    private static int lastNumber(String cell) {
        int from = cell.length();
        while (from > 0 && Character.isDigit(cell.charAt(from - 1))) {
            from--;
        }
        return from;
    }

    private static int digits(String cell, int from) {
        int at = from;
        while (at < cell.length() && cell.charAt(at) >= '0' && cell.charAt(at) <= '9') {
            at++;
        }
        return at;
    }
}
