package stirwright.exchange.internal.curves;

import java.util.Set;
import java.util.regex.Pattern;
import stirwright.correlation.Figures;
import stirwright.exchange.CurveQuantity;
import stirwright.exchange.DecimalSign;
import stirwright.exchange.internal.table.Numbers;
import stirwright.exchange.internal.table.SourceRow;
import stirwright.exchange.internal.table.Texts;

/** Why a point cannot be taken, in one sentence that names column and value. */
final class Reasons {
    /** Beyond what any rheometer measures, in 1/s and Pa; common practice, no source. */
    private static final double LEAST = 1e-12;
    private static final double MOST = 1e12;
    /** What a display shows that has no more digits: nothing but nines. */
    private static final Pattern FULL_SCALE = Pattern.compile("9{4,}([.,]9*0*)?|9{3,}[.,]9+0*");
    private static final Pattern DATE = Pattern.compile("[0-9]{4}-[0-9]{2}-[0-9]{2}.*");

    /** A number of four nines may be measured; common practice, no source. */
    private static final int MANY_NINES = 5;
    private static final CurveQuantity[] BESIDE = {CurveQuantity.VISCOSITY, CurveQuantity.TORQUE, CurveQuantity.TORQUE_PERCENT};

    private Reasons() {}

    /** Whether a cell is what a display shows when it has no more digits, or a number that was measured. */
    static boolean isNines(String cell) {
        return cell.startsWith("9") && FULL_SCALE.matcher(cell).matches();
    }

    /** Words, and signs that fill a display; one dash is a blank. */
    private static boolean isWord(String cell) {
        return cell.length() > 1 && !Numbers.isNumber(cell) && cell.chars().noneMatch(c -> c >= '0' && c <= '9');
    }

    /**
     * Empty when nothing speaks against it.
     *
     * @param nines numbers of nines that come more than once
     */
    static String of(SourceRow row, Layout layout, Column rateColumn, double rate, Column stressColumn, double stress, Group group,
            double torque, String status, boolean badStatus, Set<String> nines, DecimalSign sign, boolean commas) {
        String extra = commas ? extraCells(row, layout) : "";
        if (!extra.isEmpty()) {
            return extra;
        }
        String reason = number(row, rateColumn, rate, sign);
        reason = reason.isEmpty() ? number(row, stressColumn, stress, sign) : reason;
        if (!reason.isEmpty()) {
            return reason;
        }
        for (Column column : group.main()) {
            String cell = row.cell(column.position());
            if (column != rateColumn && isNines(cell) && cell.chars().filter(c -> c == '9').count() >= MANY_NINES
                    || nines.contains(cell) && column != rateColumn) {
                return column.name() + " '" + Texts.show(cell) + "' is a full-scale number: over range";
            }
        }
        for (CurveQuantity quantity : BESIDE) {
            Column column = group.column(quantity);
            String cell = column == null ? "" : row.cell(column.position());
            if (column != stressColumn && isWord(cell)) {
                return column.name() + " '" + Texts.show(cell) + "' is a word where a number is expected: the instrument gave the point up";
            }
        }
        if (torque >= 100 || torque <= 0) {
            return group.column(CurveQuantity.TORQUE_PERCENT).name() + " " + Figures.show(torque) + " % of full scale: "
                    + (torque > 0 ? "over range" : "under range");
        }
        return badStatus ? "status '" + Texts.show(status) + "'" : "";
    }

    private static String number(SourceRow row, Column column, double value, DecimalSign sign) {
        if (value >= LEAST && value <= MOST) {
            return "";
        }
        String cell = row.cell(column.position());
        String name = column.name() + " '" + Texts.show(cell) + "' ";
        if (cell.isEmpty()) {
            return column.name() + " is blank";
        }
        if (Double.isNaN(value)) {
            return name + wrong(PointReader.plain(cell), sign);
        }
        if (value == 0) {
            return name + "is zero: not measured, or under range; values must be greater than 0";
        }
        if (value < 0) {
            return name + "is negative; values must be greater than 0";
        }
        return name + "is beyond what any rheometer measures";
    }

    private static String wrong(String cell, DecimalSign sign) {
        if (DATE.matcher(cell).matches()) {
            return "is a date; a spreadsheet may have made one of a number such as 9.10: write the number again";
        }
        if (Character.isLetter(cell.charAt(0)) || Numbers.problem(cell, sign).startsWith("is not")
                && cell.chars().noneMatch(c -> c >= '0' && c <= '9')) {
            return "is a word where a number is expected";
        }
        return Numbers.problem(cell, sign);
    }

    /** Between commas a decimal comma without quotes moves every cell after it. */
    private static String extraCells(SourceRow row, Layout layout) {
        for (int i = layout.width(); layout.width() > 0 && i < row.cells().size(); i++) {
            if (!row.cell(i).isEmpty()) {
                return "column " + (i + 1) + " '" + Texts.show(row.cell(i)) + "' has no name: the row has " + row.cells().size()
                        + " cells, the header " + layout.width() + "; between commas a decimal comma needs quotes";
            }
        }
        return "";
    }
}
