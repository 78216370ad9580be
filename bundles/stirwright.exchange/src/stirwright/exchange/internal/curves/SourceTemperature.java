package stirwright.exchange.internal.curves;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import stirwright.exchange.Measurement;

/** Files of one sample that are told apart by the temperature in their names. */
public final class SourceTemperature {
    /** A T with a number may be a sample's name as well, so it counts only where the temperature was measured. */
    private static final Pattern LETTER = Pattern.compile("(?<![\\p{L}0-9])T[ =_]?([0-9]{1,3})(?![\\p{L}0-9.,])");

    private SourceTemperature() {}

    /** The source's name without its temperature; empty when it has none, or another one than the curve. */
    public static Optional<String> without(Measurement from) {
        String stem = from.source().replaceFirst("\\.[^.]*$", "");
        double said = TemperatureInName.of(stem);
        if (!Double.isNaN(said)) {
            return agrees(said, from) ? Optional.of(TemperatureInName.without(stem)) : Optional.empty();
        }
        Matcher letter = LETTER.matcher(stem);
        return letter.find() && agrees(Double.parseDouble(letter.group(1)), from)
                ? Optional.of(letter.replaceFirst(" ").strip()) : Optional.empty();
    }

    private static boolean agrees(double said, Measurement from) {
        return !Double.isNaN(from.temperature()) && Measurement.sameTemperature(said, from.temperature());
    }
}
