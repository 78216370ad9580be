package stirwright.study.internal;

import java.math.BigDecimal;
import java.util.regex.Pattern;

/** Numbers as they stand in a study's file. */
public final class Decimals {
    private static final Pattern FORM = Pattern.compile("[+-]?(\\d+(\\.\\d*)?|\\.\\d+)([eE][+-]?\\d+)?");
    /** Beyond these powers of ten the zeros of a plain number hide its size. */
    private static final int LARGEST = 6;
    private static final int SMALLEST = -5;

    private Decimals() {}

    /** The fewest digits that give the very same double again; without a power of ten where that reads well. */
    public static String text(double value) {
        if (value == 0 || !Double.isFinite(value)) {
            return Double.compare(value, -0.0) == 0 ? "-0" : value == 0 ? "0" : Double.toString(value);
        }
        BigDecimal digits = BigDecimal.valueOf(value).stripTrailingZeros();
        int power = digits.precision() - digits.scale() - 1;
        return power <= LARGEST && power >= SMALLEST ? digits.toPlainString()
                : digits.movePointLeft(power).toPlainString() + "e" + power;
    }

    /** @throws NumberFormatException when it is not a plain decimal number or not within double precision */
    public static double parse(String text) {
        double value = FORM.matcher(text).matches() ? Double.parseDouble(text) : Double.NaN;
        // A number that a double cannot tell from nothing is not zero.
        boolean lost = value == 0 && text.split("[eE]")[0].matches(".*[1-9].*");
        if (!Double.isFinite(value) || lost) {
            throw new NumberFormatException("'" + text + "' is not a plain decimal number");
        }
        return value;
    }
}
