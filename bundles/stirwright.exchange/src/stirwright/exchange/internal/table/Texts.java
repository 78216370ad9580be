package stirwright.exchange.internal.table;

import java.util.regex.Pattern;

/** Text of cells, as it is compared and as it is shown in a message of one line. */
public final class Texts {
    private static final int MOST_SHOWN = 40;
    private static final int KEPT = 2 * MOST_SHOWN;
    private static final Pattern BREAKS = Pattern.compile("[\\p{Cc}\\u2028\\u2029]");

    private Texts() {}

    /** Without white space at its ends, spreadsheets' no-break spaces included. */
    public static String trim(String text) {
        int from = 0;
        int to = text.length();
        while (from < to && isSpace(text.charAt(from))) {
            from++;
        }
        while (to > from && isSpace(text.charAt(to - 1))) {
            to--;
        }
        return text.substring(from, to);
    }

    private static boolean isSpace(char c) {
        if (c > ' ' && c < 0x7F) {
            return false;
        }
        return Character.isWhitespace(c) || Character.isSpaceChar(c) || c == '\uFEFF';
    }

    /** On one line and at most 40 characters long. */
    public static String show(String text) {
        String whole = trim(text.length() > KEPT ? text.substring(0, KEPT) : text);
        if (text.length() > KEPT || whole.length() > MOST_SHOWN) {
            String cut = whole.substring(0, Math.min(whole.length(), MOST_SHOWN - 1));
            boolean halved = !cut.isEmpty() && Character.isHighSurrogate(cut.charAt(cut.length() - 1));
            whole = (halved ? cut.substring(0, cut.length() - 1) : cut) + "…";
        }
        return BREAKS.matcher(whole).replaceAll(" ");
    }
}
