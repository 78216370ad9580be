package stirwright.correlation;

import java.util.LinkedHashSet;
import java.util.Set;
import java.util.regex.MatchResult;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** A formula template with {@code {name}} where a constant or a curve stands. */
final class FormulaText {
    private static final Pattern SLOT = Pattern.compile("\\{([a-zA-Z][a-zA-Z0-9]*)}");

    private FormulaText() {}

    static Set<String> slots(String template) {
        Set<String> names = new LinkedHashSet<>();
        SLOT.matcher(template).results().forEach(slot -> names.add(slot.group(1)));
        return names;
    }

    static String print(String template, Constants constants) {
        return SLOT.matcher(template).replaceAll(slot -> Matcher.quoteReplacement(value(slot, constants)));
    }

    static String names(String template) {
        return SLOT.matcher(template).replaceAll("$1");
    }

    private static String value(MatchResult slot, Constants constants) {
        String name = slot.group(1);
        return constants.curveNames().contains(name)
                ? constants.curve(name).toString()
                : Figures.exact(constants.get(name));
    }
}
