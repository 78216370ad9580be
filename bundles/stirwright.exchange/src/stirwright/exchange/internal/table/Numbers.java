package stirwright.exchange.internal.table;

import stirwright.exchange.DecimalSign;

/**
 * Numbers as plain decimals: digits, at most one decimal sign, at most one power of ten. Nothing
 * else that a programming language may take for a number (hexadecimal, "1d", "NaN", "Infinity").
 */
public final class Numbers {

    private Numbers() {}

    /** The value, or NaN where {@link #problem} has something to say. */
    public static double parse(String text, DecimalSign sign) {
        if (!hasForm(text, sign)) {
            return Double.NaN;
        }
        return checked(text, sign == DecimalSign.COMMA ? text.replace(',', '.') : text);
    }

    /**
     * The value times a power of ten, rounded once, so that 166 dyn/cm2 are the very number that 16.6 Pa are; NaN where
     * {@link #problem} has something to say.
     */
    public static double parse(String text, DecimalSign sign, int power) {
        if (power == 0) {
            return parse(text, sign);
        }
        if (!hasForm(text, sign)) {
            return Double.NaN;
        }
        String plain = sign == DecimalSign.COMMA ? text.replace(',', '.') : text;
        int exponent = Math.max(plain.indexOf('e'), plain.indexOf('E'));
        if (exponent >= 0 && plain.length() - exponent > 6) {
            return Double.NaN;
        }
        return checked(text, exponent < 0 ? plain + "e" + power
                : plain.substring(0, exponent) + "e" + (Integer.parseInt(plain.substring(exponent + 1)) + power));
    }

    private static double checked(String text, String plain) {
        double value = Double.parseDouble(plain);
        boolean lost = Double.isInfinite(value) || value == 0 && !isZero(text);
        return lost ? Double.NaN : value;
    }

    /** Why a text is no number, to follow its column and value. */
    public static String problem(String text, DecimalSign sign) {
        if (hasForm(text, sign)) {
            return "is beyond the numbers that a computer's double precision holds";
        }
        if (hasForm(text, sign.other())) {
            return "has a " + sign.other().words() + ", but this file's numbers have a " + sign.words();
        }
        if (text.matches("[+-]?\\d{1,3}([.,' \\u00A0\\u2009\\u202F]\\d{3})+([.,]\\d*)?")) {
            return "has a thousands separator; write digits and one decimal sign only";
        }
        return "is not a plain decimal number without unit";
    }

    /** Whether the text is a number that holds this very decimal sign. */
    public static boolean shows(String text, DecimalSign sign) {
        return text.indexOf(sign.sign()) >= 0 && hasForm(text, sign);
    }

    /** Whether the text is a number under either decimal sign. */
    public static boolean isNumber(String text) {
        return hasForm(text, DecimalSign.POINT) || hasForm(text, DecimalSign.COMMA);
    }

    private static boolean hasForm(String text, DecimalSign sign) {
        int at = skipSign(text, 0);
        int digits = skipDigits(text, at);
        int count = digits - at;
        at = digits;
        if (at < text.length() && text.charAt(at) == sign.sign()) {
            digits = skipDigits(text, at + 1);
            count += digits - at - 1;
            at = digits;
        }
        if (count == 0) {
            return false;
        }
        if (at < text.length() && (text.charAt(at) == 'e' || text.charAt(at) == 'E')) {
            int exponent = skipSign(text, at + 1);
            at = skipDigits(text, exponent);
            return at == text.length() && at > exponent;
        }
        return at == text.length();
    }

    private static int skipSign(String text, int at) {
        return at < text.length() && (text.charAt(at) == '+' || text.charAt(at) == '-') ? at + 1 : at;
    }

    private static int skipDigits(String text, int from) {
        int at = from;
        while (at < text.length() && text.charAt(at) >= '0' && text.charAt(at) <= '9') {
            at++;
        }
        return at;
    }

    private static boolean isZero(String text) {
        for (int i = 0; i < text.length() && text.charAt(i) != 'e' && text.charAt(i) != 'E'; i++) {
            if (text.charAt(i) >= '1' && text.charAt(i) <= '9') {
                return false;
            }
        }
        return true;
    }
}
