package stirwright.chart.internal;

import java.math.BigDecimal;
import java.math.MathContext;

/** Numbers as a person writes them. */
public final class Numbers {
    private static final String RAISED = "⁰¹²³⁴⁵⁶⁷⁸⁹";
    private static final MathContext FOUR = new MathContext(4);

    private Numbers() { }

    /** A power of ten: 0.01, 0.1, 1, 10, 100, else 10³, 10⁻³. */
    public static String decade(int exponent) {
        return exponent >= -2 && exponent <= 2 ? BigDecimal.ONE.scaleByPowerOfTen(exponent).toPlainString()
                : "10" + raised(exponent);
    }

    /** Four significant digits, with a power of ten below 0.001 and from 100,000. */
    public static String reading(double value) {
        return value == 0 ? "0" : Double.isFinite(value) ? words(new BigDecimal(value).round(FOUR), true) : "none";
    }

    /** As short as it can be, for a tick; {@code step} is the distance to the next one and takes noise away. */
    public static String tick(double value, double step) {
        if (Math.abs(value) < step * 1e-6) {
            return "0";
        }
        int places = 1 - (int) Math.floor(Math.log10(step));
        BigDecimal rounded = new BigDecimal(value).setScale(places, java.math.RoundingMode.HALF_EVEN);
        return words(rounded.stripTrailingZeros(), false);
    }

    private static String words(BigDecimal number, boolean keepZeros) {
        int exponent = number.precision() - number.scale() - 1;
        String sign = number.signum() < 0 ? "−" : "";
        BigDecimal size = number.abs();
        if (exponent >= -3 && exponent < 5) {
            BigDecimal plain = keepZeros && exponent < 3 ? size.setScale(3 - exponent) : size;
            return sign + plain.toPlainString();
        }
        BigDecimal front = size.scaleByPowerOfTen(-exponent);
        front = keepZeros ? front.setScale(3) : front.stripTrailingZeros();
        boolean bare = !keepZeros && front.compareTo(BigDecimal.ONE) == 0;
        return sign + (bare ? "" : front.toPlainString() + "×") + "10" + raised(exponent);
    }

    private static String raised(int exponent) {
        StringBuilder text = new StringBuilder(exponent < 0 ? "⁻" : "");
        Integer.toString(Math.abs(exponent)).chars().forEach(digit -> text.append(RAISED.charAt(digit - '0')));
        return text.toString();
    }
}
