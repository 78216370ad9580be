package stirwright.exchange.internal.curves;

import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.stream.Stream;
import stirwright.exchange.CurveQuantity;

/**
 * The columns of one sample.
 *
 * @param sample from 1
 * @param label what the header calls it; may be empty
 * @param main those of shear rate, stress and viscosity, as far as they are there
 */
record Group(int sample, String label, Map<CurveQuantity, Column> columns, List<Column> main) {

    static Group of(int sample, String label, Map<CurveQuantity, Column> columns) {
        return new Group(sample, label, columns, Stream.of(CurveQuantity.SHEAR_RATE, CurveQuantity.SHEAR_STRESS,
                CurveQuantity.VISCOSITY).map(columns::get).filter(Objects::nonNull).toList());
    }

    /** Null without. */
    Column column(CurveQuantity quantity) {
        return columns.get(quantity);
    }

    boolean complete() {
        return columns.containsKey(CurveQuantity.SHEAR_RATE) && main.size() > 1;
    }
}
