package stirwright.correlation;

import java.math.BigDecimal;
import java.math.MathContext;

/** Numbers as people read them in bounds, formulas and messages. */
public final class Figures {
    private static final MathContext FOUR = new MathContext(4);
    /** Powers of ten up to here are scaled without overflow. */
    private static final int SCALABLE = 290;
    private static final double LARGE = 1e6;
    private static final double SMALL = 1e-4;

    private Figures() {}

    /** Four significant digits, no trailing zeros, a power of ten only for very large or small. */
    public static String show(double value) {
        if (!Double.isFinite(value)) {
            return other(value);
        }
        int exponent = (int) Math.floor(Math.log10(Math.abs(value)));
        if (Math.abs(exponent) > SCALABLE || value == 0) {
            return plain(new BigDecimal(value).round(FOUR));
        }
        // Rounding a scaled double is ten times faster than an exact decimal, and tables show many numbers.
        int decimals = FOUR.getPrecision() - 1 - exponent;
        return plain(BigDecimal.valueOf(Math.round(value * Math.pow(10, decimals)), decimals));
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
