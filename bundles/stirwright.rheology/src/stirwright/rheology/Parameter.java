package stirwright.rheology;

/**
 * A parameter of a fluid model as files name it.
 *
 * @param name   without the unit, for example {@code consistency}
 * @param column with the unit as a case table's column has it, for example {@code consistency_Pa_sn}
 * @param unit   for reading, for example {@code Pa s^n}; {@code -} for a dimensionless one
 */
public record Parameter(String name, String column, String unit) {
}
