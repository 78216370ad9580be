package stirwright.exchange;

/**
 * A column that is read.
 *
 * @param column position from 1
 * @param header as it stands there; empty without one
 * @param unit as it stands there, or the one that was assumed; empty where there is none
 * @param reason why it holds this quantity in this unit
 */
public record CurveColumn(String sheet, int column, String header, CurveQuantity quantity, String unit, String reason) {}
