package stirwright.exchange.internal.curves;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** The temperature that a name holds: "KCl/Polymer 10degC", "40 C", "ketchup_20C". */
final class TemperatureInName {
    /** Without a degree sign it takes two figures, since 3C may be a sample. A sign that joins two words is no minus. */
    private static final Pattern PATTERN = Pattern.compile("(?<![0-9.,])((?<![\\p{L}0-9)])[-\u2212])?(?<![\\p{L}])([0-9]{2,3}(?:[.,][0-9]+)?)[ _]?"
            + "C(?![\\p{L}0-9])|(?<![0-9.,])(-?)([0-9]{1,3}(?:[.,][0-9]+)?) ?(?:deg[. ]?|degrees |\u00B0 ?|\u00BA ?|\u02DA ?)C(?![\\p{L}])");

    private TemperatureInName() {}

    /** In deg C; NaN without. */
    static double of(String name) {
        Matcher matcher = PATTERN.matcher(name);
        if (!matcher.find()) {
            return Double.NaN;
        }
        boolean first = matcher.group(2) != null;
        double value = Double.parseDouble(matcher.group(first ? 2 : 4).replace(',', '.'));
        boolean minus = first ? matcher.group(1) != null : !matcher.group(3).isEmpty()
                && (matcher.start(3) == 0 || !Character.isLetterOrDigit(name.charAt(matcher.start(3) - 1)));
        return minus ? -value : value;
    }

    /** The name without it. */
    static String without(String name) {
        return PATTERN.matcher(name).replaceAll(" ").strip();
    }
}
