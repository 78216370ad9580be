package stirwright.exchange.internal.curves;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** The temperature that a sample's name holds, for instance "KCl/Polymer 10degC". */
final class TemperatureInName {
    private static final Pattern PATTERN = Pattern.compile("(?<![0-9.,])(-?[0-9]{1,3}(?:[.,][0-9]+)?) ?(?:deg ?|\u00B0 ?|\u00BA ?)C(?![A-Za-z])");

    private TemperatureInName() {}

    /** In deg C; NaN without. */
    static double of(String name) {
        Matcher matcher = PATTERN.matcher(name);
        return matcher.find() ? Double.parseDouble(matcher.group(1).replace(',', '.')) : Double.NaN;
    }
}
