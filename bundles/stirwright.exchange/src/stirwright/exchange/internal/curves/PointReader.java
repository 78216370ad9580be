package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import stirwright.exchange.CurvePoint;
import stirwright.exchange.CurveQuantity;
import stirwright.exchange.CurveSeparator;
import stirwright.exchange.DecimalSign;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.PointPlace;
import stirwright.exchange.internal.table.Numbers;

/** Reads the points of stretches and says of each one that cannot be taken why. */
final class PointReader {
    private final ImportChoice choice;
    private final DecimalSign sign;
    private final StatusWords statuses;
    private final boolean commas;

    /** @param separator null for a workbook */
    PointReader(ImportChoice choice, DecimalSign sign, StatusWords statuses, CurveSeparator separator) {
        this.choice = choice;
        this.sign = sign;
        this.statuses = statuses;
        this.commas = separator == CurveSeparator.COMMA;
    }

    List<ReadPoint> read(Stretch stretch) {
        boolean stressed = stretch.group.column(CurveQuantity.SHEAR_STRESS) != null
                && (stretch.group.column(CurveQuantity.VISCOSITY) == null || anyNumber(stretch));
        Set<String> nines = nines(stretch);
        List<ReadPoint> points = new ArrayList<>(stretch.rows.size());
        for (WorkRow row : stretch.rows) {
            points.add(read(row, stretch, stressed, nines));
        }
        return points;
    }

    /** A full-scale number comes again at each rate beyond the range. */
    private static Set<String> nines(Stretch stretch) {
        Set<String> seen = new HashSet<>();
        Set<String> again = new HashSet<>();
        for (Column column : stretch.group.main()) {
            for (WorkRow row : column.quantity() == CurveQuantity.SHEAR_RATE ? List.<WorkRow>of() : stretch.rows) {
                String cell = row.row.cell(column.position());
                if (Reasons.isNines(cell) && !seen.add(column.position() + " " + cell)) {
                    again.add(cell);
                }
            }
        }
        return again;
    }

    private static boolean anyNumber(Stretch stretch) {
        Column stress = stretch.group.column(CurveQuantity.SHEAR_STRESS);
        return stretch.rows.stream().anyMatch(r -> r.row.isTyped(stress.position()) || Numbers.isNumber(r.row.cell(stress.position())));
    }

    private ReadPoint read(WorkRow row, Stretch stretch, boolean stressed, Set<String> nines) {
        Group group = stretch.group;
        Column rateColumn = group.column(CurveQuantity.SHEAR_RATE);
        Column stressColumn = group.column(stressed ? CurveQuantity.SHEAR_STRESS : CurveQuantity.VISCOSITY);
        double rate = value(row, rateColumn);
        double viscosity = value(row, group.column(CurveQuantity.VISCOSITY));
        double stress = stressed ? value(row, stressColumn) : rate * viscosity;
        PointPlace place = new PointPlace(row.sheet, row.row.line(), group.sample());
        Column statusColumn = group.column(CurveQuantity.STATUS);
        String status = statusColumn == null ? "" : row.row.cell(statusColumn.position());
        double torque = value(row, group.column(CurveQuantity.TORQUE_PERCENT));
        boolean usable = usable(rate) && usable(stress);
        String reason = choice.leftOut().contains(place) ? "left out by hand"
                : usable && choice.putBack().contains(place) ? ""
                : Reasons.of(row.row, stretch.layout, rateColumn, rate, stressColumn, stressed ? stress : viscosity,
                        group, torque, status, statuses.isBad(status), nines, sign, commas);
        return new ReadPoint(row, new CurvePoint(place, rate, stress, viscosity, value(row, group.column(CurveQuantity.TEMPERATURE)),
                value(row, group.column(CurveQuantity.TIME)), torque, status, reason),
                row.row.cell(rateColumn.position()), row.row.cell(stressColumn.position()), usable);
    }

    private static boolean usable(double value) {
        return value > 0 && Double.isFinite(value);
    }

    /** NaN without the column, and where the cell is no number. */
    private double value(WorkRow row, Column column) {
        if (column == null) {
            return Double.NaN;
        }
        String cell = row.row.cell(column.position());
        return cell.isEmpty() ? Double.NaN
                : column.scale().read(plain(cell), row.row.isTyped(column.position()) ? DecimalSign.POINT : sign);
    }

    static String plain(String cell) {
        return cell.charAt(0) == '\u2212' ? "-" + cell.substring(1) : cell;
    }
}
