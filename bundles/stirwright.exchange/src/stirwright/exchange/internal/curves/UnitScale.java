package stirwright.exchange.internal.curves;

import stirwright.exchange.DecimalSign;
import stirwright.exchange.internal.table.Numbers;

/**
 * From a column's unit to the one that values have here: text times ten to a power, times a factor, plus an offset. Units
 * that differ by a power of ten alone are rounded once.
 *
 * @param unit as it is shown
 */
record UnitScale(String unit, int power, double factor, double offset) {

    static UnitScale ten(String unit, int power) {
        return new UnitScale(unit, power, 1, 0);
    }

    static UnitScale times(String unit, double factor) {
        return new UnitScale(unit, 0, factor, 0);
    }

    /** NaN when the text is no number. */
    double read(String text, DecimalSign sign) {
        return Numbers.parse(text, sign, power) * factor + offset;
    }

    boolean same(UnitScale other) {
        return power == other.power && factor == other.factor && offset == other.offset;
    }

    boolean plain() {
        return power == 0 && factor == 1 && offset == 0;
    }
}
