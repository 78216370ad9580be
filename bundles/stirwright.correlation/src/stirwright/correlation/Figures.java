package stirwright.correlation;

import java.math.BigDecimal;
import java.math.MathContext;

/** Numbers as people read them in bounds, formulas and messages. */
public final class Figures {
    private static final MathContext FOUR = new MathContext(4);
    private static final double LARGE = 1e6;
    private static final double SMALL = 1e-4;

    private Figures() {}

    /** Four significant digits, no trailing zeros, a power of ten only for very large or small. */
    public static String show(double value) {
        return Double.isFinite(value) ? plain(new BigDecimal(value).round(FOUR)) : other(value);
    }

    /** Every digit that the value was written with. */
    public static String exact(double value) {
        return Double.isFinite(value) ? plain(BigDecimal.valueOf(value)) : other(value);
    }

    private static String plain(BigDecimal value) {
        if (value.signum() == 0) {
            return "0";
        }
        BigDecimal stripped = value.stripTrailingZeros();
        double size = Math.abs(value.doubleValue());
        if (size < LARGE && size >= SMALL) {
            return stripped.toPlainString();
        }
        int exponent = stripped.precision() - stripped.scale() - 1;
        return stripped.movePointLeft(exponent).toPlainString() + "e" + exponent;
    }

    private static String other(double value) {
        return Double.isNaN(value) ? "unknown" : value > 0 ? "unbounded" : "minus unbounded";
    }
}
