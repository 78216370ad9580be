package stirwright.exchange.internal.curves;

import stirwright.exchange.CurveColumn;
import stirwright.exchange.CurveQuantity;
import stirwright.exchange.internal.table.Texts;

/**
 * A column that is read.
 *
 * @param position from 0
 * @param header as it stands there; may be empty
 * @param reason why it holds this quantity in this unit
 */
record Column(int position, String header, CurveQuantity quantity, UnitScale scale, String reason) {

    /** For messages. */
    String name() {
        return header.isEmpty() ? "column " + (position + 1) : Texts.show(header);
    }

    CurveColumn shown(String sheet) {
        return new CurveColumn(sheet, position + 1, header, quantity, scale.unit(), reason);
    }

    /** On one line, for a finding. */
    String words() {
        String unit = !quantity.measured() ? "" : " in " + scale.unit()
                + (scale.plain() ? "" : ", converted to " + quantity.unit());
        return "column " + (position + 1) + (header.isEmpty() ? "" : " '" + Texts.show(header) + "'") + ": "
                + quantity.words() + unit;
    }
}
