package stirwright.workbench.internal.widgets;

import java.util.List;

/** Numbers below one another with their decimal signs in one line, for cells that are set flush right. */
public final class Aligned {
    /** As wide as a digit. */
    private static final String FIGURE_SPACE = "\u2007";
    /** As wide as a decimal point. */
    private static final String PUNCTUATION_SPACE = "\u2008";

    private Aligned() {}

    /** Fills each number up on its right; a blank stays blank. */
    public static List<String> atDecimalSign(List<String> numbers) {
        int decimals = numbers.stream().mapToInt(Aligned::decimals).max().orElse(0);
        return numbers.stream().map(n -> n.isEmpty() ? n : n + filling(n, decimals)).toList();
    }

    private static int decimals(String number) {
        int sign = number.indexOf('.');
        return sign < 0 ? 0 : number.length() - sign - 1;
    }

    private static String filling(String number, int decimals) {
        int missing = decimals - decimals(number);
        return (number.indexOf('.') < 0 && decimals > 0 ? PUNCTUATION_SPACE : "") + FIGURE_SPACE.repeat(missing);
    }
}
