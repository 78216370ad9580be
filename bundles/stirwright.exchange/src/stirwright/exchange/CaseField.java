package stirwright.exchange;

import stirwright.exchange.internal.units.UnitKind;

/**
 * One number that a case is made of, as a person meets it in a form. {@link CaseFields} has them all.
 *
 * @param column its name in the case table, for example {@code impeller_diameter_m}
 * @param title in the trade's words, for example "impeller diameter"
 * @param symbol as in formulas, for example "D"
 * @param unit the column's unit, shown behind the field, for example "m"; "-" for a pure number
 * @param meaning how it is measured, for example "diameter swept by the blade tips"; empty where the title says it
 */
public record CaseField(String column, String title, String symbol, String unit, String meaning) {

    /** @throws IllegalArgumentException when the unit is none in which {@link TypedNumber} can read */
    public CaseField {
        if (UnitKind.of(unit).isEmpty()) {
            throw new IllegalArgumentException(column + ": no field is shown in unit '" + unit + "'");
        }
    }

    /** One whose title says how it is measured. */
    public CaseField(String column, String title, String symbol, String unit) {
        this(column, title, symbol, unit, "");
    }
}
