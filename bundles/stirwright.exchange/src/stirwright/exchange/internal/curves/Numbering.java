package stirwright.exchange.internal.curves;

import java.util.EnumMap;
import java.util.Map;
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

    /** The columns of a stretch; without a number by its name, the first cell counts if it joins two numbers in every row. */
    static Group found(Stretch stretch) {
        Map<CurveQuantity, Column> columns = stretch.group.columns();
        boolean named = columns.containsKey(CurveQuantity.POINT_NUMBER) || columns.containsKey(CurveQuantity.SEGMENT_NUMBER)
                || columns.containsKey(CurveQuantity.SEGMENT_AND_POINT) || columns.values().stream().anyMatch(c -> c.position() == 0);
        Column first = new Column(0, "", CurveQuantity.POINT_NUMBER, UnitWords.own(CurveQuantity.POINT_NUMBER), "");
        if (named || !stretch.rows.stream().allMatch(r -> isJoined(r.row.cell(0), first))) {
            return stretch.group;
        }
        Map<CurveQuantity, Column> more = new EnumMap<>(columns);
        more.put(CurveQuantity.POINT_NUMBER, first);
        return Group.of(stretch.group.sample(), stretch.group.label(), more);
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
