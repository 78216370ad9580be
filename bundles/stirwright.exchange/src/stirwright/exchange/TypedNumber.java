package stirwright.exchange;

import java.math.BigDecimal;
import stirwright.correlation.Figures;
import stirwright.exchange.internal.units.TypedText;

/**
 * A number as somebody typed it into a field, with or without a unit: "0.9", "900 mm", "0,9 m".
 *
 * <p>Converted exactly and rounded once; a factor of pi (rad) carries 34 digits before that. A single point
 * or comma is always the decimal sign, so {@code 1.350} is 1.35 and never a thousand and more; what can still be read in
 * two ways is a problem in words. Whether the value is plausible is for others to say.
 */
public sealed interface TypedNumber {

    /**
     * @param value in the unit of the field's column
     * @param unit the unit as typed; empty when there was none
     */
    record Value(double value, String unit) implements TypedNumber {}

    /** Nothing was typed. */
    record Blank() implements TypedNumber {}

    /** @param words one sentence that names the field, what was typed, and what is expected */
    record Problem(String words) implements TypedNumber {}

    /** Reads what was typed into a field. A number without unit is in the unit of the field. */
    static TypedNumber read(String text, CaseField field) {
        return TypedText.read(text, field);
    }

    /**
     * The shortest decimal that reads back as the same number, with a decimal point; plain from 1e-4 to 1e7, beyond
     * that with a power of ten. Zero has no sign; NaN, which stands for "not given", is blank.
     *
     * @throws IllegalArgumentException when the value is infinite
     */
    static String show(double value) {
        if (Double.isInfinite(value)) {
            throw new IllegalArgumentException("a field cannot show " + value);
        }
        if (Double.isNaN(value)) {
            return "";
        }
        double size = Math.abs(value);
        return size >= 1e-4 && size <= 1e7
                ? BigDecimal.valueOf(value).stripTrailingZeros().toPlainString()
                : Figures.exact(value);
    }
}
