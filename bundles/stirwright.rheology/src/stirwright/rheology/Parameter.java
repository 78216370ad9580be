package stirwright.rheology;

/**
 * A parameter of a fluid model as files name it and people call it.
 *
 * @param name   without the unit, for example {@code consistency}
 * @param column with the unit as a case table's column has it, for example {@code consistency_Pa_sn}
 * @param title  in the trade's words, for example {@code zero-shear viscosity}
 * @param symbol as in the models' formulas, for example {@code K}
 * @param unit   for reading, for example {@code Pa s^n}; {@code -} for a dimensionless one
 */
public record Parameter(String name, String column, String title, String symbol, String unit) {
}
