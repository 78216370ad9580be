package stirwright.exchange.internal.curves;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import stirwright.exchange.CurveQuantity;

/**
 * What the name of a column says.
 *
 * @param quantity what it holds
 * @param unit as it stands there; empty without one
 * @param label what is left, for instance the name of a sample
 */
record HeaderCell(CurveQuantity quantity, String unit, String label) {
    private static final Pattern BRACKETS = Pattern.compile("[\\[({<]([^\\])}>]*)[\\])}>]");
    private static final Pattern LEAD = Pattern.compile("^[\\s_,:/.-]*(?:(?:in|en|em)\\s+)?");
    private static final Pattern LOOKS_LIKE_A_UNIT = Pattern.compile(".*[/%^\u00B0\u00B7].*|.*\\p{L}[-\u2212]?[0-9].*|\\[.*");
    private static final Pattern REMARK = Pattern.compile("[\\p{L} ]{4,}");
    private static final int LONGEST = 120;

    /** Empty when the text names none of the quantities. */
    static Optional<HeaderCell> read(String text) {
        if (text.isEmpty() || text.length() > LONGEST) {
            return Optional.empty();
        }
        Folded folded = Folded.of(text);
        if (folded.hasAny(HeaderWords.OTHER_THINGS)) {
            return Optional.empty();
        }
        for (Map.Entry<String, CurveQuantity> phrase : HeaderWords.BY_LENGTH) {
            int at = folded.find(phrase.getKey());
            if (at >= 0) {
                return Optional.of(named(phrase.getValue(), folded.before(at), folded.after(at, phrase.getKey().length() - 2)));
            }
        }
        return shortly(folded);
    }

    /** One letter is a quantity only with a unit of its own behind it, or alone. */
    private static Optional<HeaderCell> shortly(Folded folded) {
        String first = folded.words().split(" ")[0];
        List<CurveQuantity> candidates = HeaderWords.SHORT.getOrDefault(first, List.of());
        if (candidates.isEmpty()) {
            return folded.of().strip().equals("%") ? Optional.of(new HeaderCell(CurveQuantity.TORQUE_PERCENT, "%", "")) : Optional.empty();
        }
        int at = folded.find(" " + first + " ");
        String rest = folded.after(at, first.length());
        for (CurveQuantity quantity : candidates) {
            HeaderCell cell = named(quantity, folded.before(at), rest);
            boolean known = quantity.measured() && UnitWords.find(quantity, cell.unit()).isPresent();
            boolean alone = LEAD.matcher(rest).replaceFirst("").isBlank() && (first.length() > 1 || !quantity.measured());
            if (known || alone || !quantity.measured() && first.length() > 1) {
                return Optional.of(cell);
            }
        }
        return Optional.empty();
    }

    private static HeaderCell named(CurveQuantity quantity, String before, String after) {
        if (!quantity.measured()) {
            return new HeaderCell(quantity, "", "");
        }
        if (quantity == CurveQuantity.TORQUE && (before + after).indexOf('%') >= 0) {
            return new HeaderCell(CurveQuantity.TORQUE_PERCENT, "%", "");
        }
        Matcher brackets = BRACKETS.matcher(after);
        while (brackets.find()) {
            String inside = brackets.group(1).strip();
            if (UnitWords.find(quantity, inside).isPresent() || !remark(brackets.group(), inside)) {
                return new HeaderCell(quantity, inside, label(before, brackets.replaceAll(" ")));
            }
        }
        return trailing(quantity, before, after.replaceFirst("\\([^)]*\\)", " "));
    }

    /** Round brackets may hold a word of their own, square ones hold units. */
    private static boolean remark(String whole, String inside) {
        return inside.isEmpty() || whole.startsWith("(") && REMARK.matcher(inside).matches();
    }

    /** "Viscosity cP", "Viskosität / mPa·s", "shear_rate_1_s", "Shear stress in Pa". */
    private static HeaderCell trailing(CurveQuantity quantity, String before, String after) {
        String rest = LEAD.matcher(after).replaceFirst("").strip();
        for (String spelled = rest; !spelled.isEmpty(); spelled = behindSpace(spelled)) {
            for (String unit : List.of(spelled, spelled.replaceFirst("_", "/"))) {
                if (UnitWords.find(quantity, unit).isPresent()) {
                    return new HeaderCell(quantity, unit, label(before, rest.substring(0, rest.length() - spelled.length())));
                }
            }
        }
        boolean bold = !rest.isEmpty() && (LOOKS_LIKE_A_UNIT.matcher(rest).matches() || rest.length() < after.strip().length()
                && (after.strip().startsWith("/") || after.matches("\\s+(in|en|em)\\s.*")));
        return bold ? new HeaderCell(quantity, rest, label(before, "")) : new HeaderCell(quantity, "", label(before, rest));
    }

    private static String behindSpace(String text) {
        int at = text.indexOf(' ');
        return at < 0 ? "" : text.substring(at + 1).strip();
    }

    private static String label(String before, String after) {
        return (before.strip() + " " + after.strip()).replaceAll("^[\\s_,:;./|-]+|[\\s_,:;./|-]+$", "");
    }
}
