package stirwright.exchange.internal.cases;

import static stirwright.exchange.internal.cases.CaseColumns.IMPELLER_DIAMETER;
import static stirwright.exchange.internal.cases.CaseColumns.SPEEDS;
import static stirwright.exchange.internal.cases.CaseColumns.SPEED_REV_S;
import static stirwright.exchange.internal.cases.CaseColumns.SPEED_RPM;
import static stirwright.exchange.internal.cases.CaseColumns.TARGET_POWER_PER_VOLUME;
import static stirwright.exchange.internal.cases.CaseColumns.TARGET_SHEAR_RATE;
import static stirwright.exchange.internal.cases.CaseColumns.TARGET_TIP_SPEED;

import java.util.List;
import stirwright.core.CaseRefusedException;
import stirwright.core.SpeedDemand;
import stirwright.correlation.Figures;

/** The one speed or target of a row. */
final class SpeedCells {

    private static final double SECONDS_PER_MINUTE = 60;

    private SpeedCells() {}

    /** @throws CaseRefusedException unless exactly one is given and plausible */
    static SpeedDemand read(Cells cells) {
        List<String> given = cells.given(SPEEDS);
        if (given.isEmpty()) {
            throw new CaseRefusedException(SPEED_RPM, "", "is blank and so are "
                    + String.join(", ", SPEEDS.subList(1, SPEEDS.size())) + "; give exactly one of them");
        }
        String column = given.get(0);
        if (given.size() > 1) {
            throw cells.refusal(column, "stands beside " + cells.inWords(given.subList(1, given.size()))
                    + "; give exactly one of them");
        }
        double value = cells.positive(column);
        return switch (column) {
            case SPEED_RPM -> new SpeedDemand.At(plausible(cells, column, value / SECONDS_PER_MINUTE));
            case SPEED_REV_S -> new SpeedDemand.At(plausible(cells, column, value));
            case TARGET_SHEAR_RATE -> new SpeedDemand.ForShearRate(value);
            case TARGET_POWER_PER_VOLUME -> new SpeedDemand.ForPowerPerVolume(value);
            case TARGET_TIP_SPEED -> new SpeedDemand.ForTipSpeed(plausibleTip(cells, column, value, ""));
            default -> throw new IllegalStateException(column);
        };
    }

    private static double plausible(Cells cells, String column, double revolutionsPerSecond) {
        String hint = column.equals(SPEED_REV_S) ? "; is the speed in rev/min, or " : "; check the speed, and whether ";
        plausibleTip(cells, column, Math.PI * revolutionsPerSecond * cells.number(IMPELLER_DIAMETER),
                hint + IMPELLER_DIAMETER + " " + cells.shown(IMPELLER_DIAMETER)
                        + (column.equals(SPEED_REV_S) ? " in mm?" : " is in m"));
        return revolutionsPerSecond;
    }

    private static double plausibleTip(Cells cells, String column, double tipSpeed, String hint) {
        if (tipSpeed > SpeedDemand.MOST_TIP_SPEED) {
            throw cells.refusal(column, "means a tip speed of " + Figures.show(tipSpeed) + " m/s, above the limit of "
                    + Figures.show(SpeedDemand.MOST_TIP_SPEED) + " m/s (common practice, no source)" + hint);
        }
        return tipSpeed;
    }
}
