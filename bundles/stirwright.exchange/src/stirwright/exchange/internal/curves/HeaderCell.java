package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
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
    /** A factor in a name may have been applied, or be still to apply. */
    private static final Pattern MULTIPLE = Pattern.compile("[x\u00D7*\u00B7\u00F7]\\s*1(?:0+\\b|[eE][-+]?[0-9]|0[\\^\u207B\u00B9\u00B2\u00B3\u2070-\u2079])"
            + "|\\b10\\s*(?:\\^|[\u207B\u00B9\u00B2\u00B3\u2070-\u2079])\\S*");
    private static final Pattern AT_TEMPERATURE = Pattern.compile(
            "(?:(?:\\b(?:at|bei|a)|@|,)\\s*)?(?<![\\p{L}0-9^/*.-])([-+]?[0-9]+(?:[.,][0-9]+)?\\s*(?:[\u00B0\u00BA\u02DA]|deg\\.?)\\s*[CF]\\b)");
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
        Matcher at = main(quantity) ? AT_TEMPERATURE.matcher(after) : null;
        boolean tempered = at != null && at.find();
        String rest = tempered ? after.substring(0, at.start()) + " " + after.substring(at.end()) : after;
        String bare = BRACKETS.matcher(rest).replaceAll(" ");
        HeaderCell behind = trailing(quantity, before, bare);
        HeaderCell found = bracketed(quantity, before, rest, bare, behind);
        return tempered ? new HeaderCell(quantity, found.unit(), label(found.label(), at.group(1))) : found;
    }

    /** A known unit in any bracket, else one behind the name; whatever might be another unit is named, so that it is asked for. */
    private static HeaderCell bracketed(CurveQuantity quantity, String before, String after, String bare, HeaderCell behind) {
        Matcher times = MULTIPLE.matcher(before + " " + bare);
        if (times.find()) {
            return new HeaderCell(quantity, times.group().strip(), label(before, ""));
        }
        Set<String> known = new LinkedHashSet<>();
        Set<UnitScale> scales = new HashSet<>();
        if (!behind.unit().isEmpty() && UnitWords.find(quantity, behind.unit()).isPresent()) {
            known.add(behind.unit());
            scales.add(UnitWords.find(quantity, behind.unit()).get());
        }
        boolean behindKnown = !known.isEmpty();
        String strange = "";
        Matcher brackets = BRACKETS.matcher(after);
        while (brackets.find()) {
            String whole = brackets.group(1).strip();
            // "cP, spindle 4"
            int comma = UnitWords.find(quantity, whole).isPresent() ? -1 : whole.indexOf(',');
            String inside = comma > 0 && UnitWords.find(quantity, whole.substring(0, comma)).isPresent() ? whole.substring(0, comma) : whole;
            Optional<UnitScale> scale = UnitWords.find(quantity, inside);
            if (scale.isPresent()) {
                known.add(inside);
                scales.add(scale.get());
            } else if (strange.isEmpty() && !remark(brackets.group(), inside)) {
                strange = inside;
            }
        }
        if (scales.size() > 1) {
            return new HeaderCell(quantity, String.join(" or ", known), label(before, ""));
        }
        if (behindKnown || known.isEmpty() && strange.isEmpty()) {
            return behind;
        }
        return new HeaderCell(quantity, known.isEmpty() ? strange : known.iterator().next(), label(before, bare));
    }

    /**
     * A name that is not known, told by its unit alone: one of a shear rate, a shear stress or a viscosity that nothing
     * else has. Empty for all others, and for a unit that stands alone.
     *
     * @param below the unit in the row below; empty without
     */
    static Optional<HeaderCell> byUnit(String text, String below) {
        if (text.isEmpty() || text.length() > LONGEST || read(text).isPresent()) {
            return Optional.empty();
        }
        Folded folded = Folded.of(text);
        if (folded.hasAny(HeaderWords.OTHER_THINGS) || folded.hasAny(HeaderWords.NOT_BY_UNIT)) {
            return Optional.empty();
        }
        List<String> units = new ArrayList<>(List.of(below));
        Matcher brackets = BRACKETS.matcher(text);
        while (brackets.find()) {
            if (named(text.substring(0, brackets.start()))) {
                units.add(brackets.group(1).strip());
            }
        }
        String bare = BRACKETS.matcher(text).replaceAll(" ");
        for (int i = bare.indexOf(' '); i >= 0; i = bare.indexOf(' ', i + 1)) {
            if (named(bare.substring(0, i))) {
                units.add(LEAD.matcher(bare.substring(i)).replaceFirst("").strip());
            }
        }
        if (MULTIPLE.matcher(bare).find() || !named(bare)) {
            return Optional.empty();
        }
        for (String unit : units) {
            Optional<CurveQuantity> quantity = UnitWords.telling(unit);
            if (quantity.isPresent()) {
                return Optional.of(new HeaderCell(quantity.get(), unit, ""));
            }
        }
        return Optional.empty();
    }

    private static boolean named(String text) {
        return text.chars().anyMatch(Character::isLetter);
    }

    private static boolean main(CurveQuantity quantity) {
        return quantity == CurveQuantity.SHEAR_RATE || quantity == CurveQuantity.SHEAR_STRESS || quantity == CurveQuantity.VISCOSITY;
    }

    /** Round brackets may hold a word of their own, from a list; square ones hold units. */
    private static boolean remark(String whole, String inside) {
        String words = Folded.of(inside).words();
        return words.isEmpty() && inside.chars().noneMatch(c -> c == '%' || c == '\u00B0')
                || whole.startsWith("(") && Arrays.stream(words.split(" ")).allMatch(HeaderWords.REMARKS::contains);
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
