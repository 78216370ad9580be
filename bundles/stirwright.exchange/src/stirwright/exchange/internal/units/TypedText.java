package stirwright.exchange.internal.units;

import java.math.BigDecimal;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import stirwright.exchange.CaseField;
import stirwright.exchange.TypedNumber;
import stirwright.exchange.DecimalSign;
import stirwright.exchange.internal.table.Numbers;
import stirwright.exchange.internal.table.Texts;

/** Parts what was typed into number and unit. */
public final class TypedText {
    private static final Pattern PARTS =
            Pattern.compile("([+-]?[0-9.,]*[0-9][.,]?(?:[eE][+-]?[0-9]+)?)(.*)", Pattern.DOTALL);
    /** 1,350: neither a leading zero nor the count of digits tells a decimal comma from a thousands separator. */
    private static final Pattern EITHER = Pattern.compile("[+-]?[1-9][0-9]{0,2},[0-9]{3}(?:[eE].*)?");
    /** A second number, unless it is the 1 of 1/s. */
    private static final Pattern SECOND_NUMBER = Pattern.compile("['\u2019,.]?(?!1\\s*/\\s*[^0-9\\s])[0-9].*", Pattern.DOTALL);
    private static final int LONGEST = 100;

    private TypedText() {}

    /** See {@link TypedNumber#read}. */
    public static TypedNumber read(String text, CaseField field) {
        String typed = Texts.trim(text).replace('\u2212', '-');
        if (typed.isEmpty()) {
            return new TypedNumber.Blank();
        }
        Matcher parts = PARTS.matcher(typed);
        if (typed.length() > LONGEST || !parts.matches()) {
            return noNumber(typed, field);
        }
        String number = parts.group(1);
        String unit = Texts.trim(parts.group(2));
        long signs = number.chars().filter(c -> c == '.' || c == ',').count();
        if (signs > 1 || SECOND_NUMBER.matcher(unit).matches()) {
            return problem(field, typed, "has a thousands separator or more than one number; write digits and one"
                    + " decimal sign only, for instance " + kind(field).example());
        }
        if (EITHER.matcher(number).matches()) {
            return problem(field, typed, "can be read as " + number.replace(',', '.') + " or as "
                    + number.replace(",", "") + "; write the one that you mean");
        }
        DecimalSign sign = number.indexOf(',') >= 0 ? DecimalSign.COMMA : DecimalSign.POINT;
        double value = Numbers.parse(number, sign);
        if (Double.isNaN(value)) {
            return Numbers.isNumber(number) ? problem(field, typed, Numbers.problem(number, sign)) : noNumber(typed, field);
        }
        if (unit.isEmpty() || unit.equals(field.unit())) {
            return new TypedNumber.Value(value, unit);
        }
        // A zero is taken without its power of ten, which might be too large to be worked with.
        BigDecimal exact = value == 0 ? BigDecimal.ZERO : new BigDecimal(number.replace(',', '.'));
        return converted(exact, unit, typed, field);
    }

    private static TypedNumber converted(BigDecimal number, String unit, String typed, CaseField field) {
        try {
            double value = UnitConversion.convert(number, unit, field.unit(), kind(field));
            return Double.isInfinite(value) || value == 0 && number.signum() != 0
                    ? problem(field, typed, "is beyond the numbers that a computer's double precision holds")
                    : new TypedNumber.Value(value, unit);
        } catch (UnitRefusedException refused) {
            return problem(field, typed, refused.getMessage());
        }
    }

    private static TypedNumber noNumber(String typed, CaseField field) {
        return problem(field, typed, "is no number; write for instance " + kind(field).example());
    }

    private static TypedNumber problem(CaseField field, String typed, String words) {
        return new TypedNumber.Problem(field.title() + ": '" + Texts.show(typed) + "' " + words);
    }

    private static UnitKind kind(CaseField field) {
        return UnitKind.of(field.unit()).orElseThrow();
    }
}
