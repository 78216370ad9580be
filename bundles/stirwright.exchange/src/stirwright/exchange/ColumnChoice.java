package stirwright.exchange;

import java.util.Optional;

/**
 * What somebody said of a column.
 *
 * @param sheet of a workbook; empty for every sheet and for text
 * @param column position from 1
 * @param quantity what it holds; empty: it is not read
 * @param unit as a header would write it, for instance "mPa s"; empty: the one found, else SI
 */
public record ColumnChoice(String sheet, int column, Optional<CurveQuantity> quantity, String unit) {

    public boolean speaksOf(String ofSheet, int ofColumn) {
        return column == ofColumn && (sheet.isEmpty() || sheet.equals(ofSheet));
    }
}
