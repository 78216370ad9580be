package stirwright.exchange.internal.table;

import java.util.BitSet;
import java.util.List;

/**
 * A row of a source as it stands there.
 *
 * @param line on which it begins, from 1
 * @param cells trimmed
 * @param typed which cells a workbook holds as numbers, written with a decimal point then; null for none
 */
public record SourceRow(int line, List<String> cells, BitSet typed) {

    /** The cell's text; empty beyond the last. */
    public String cell(int at) {
        return at >= 0 && at < cells.size() ? cells.get(at) : "";
    }

    public boolean isTyped(int at) {
        return typed != null && typed.get(at);
    }

    public boolean blank() {
        for (String cell : cells) {
            if (!cell.isEmpty()) {
                return false;
            }
        }
        return true;
    }

    public int filled() {
        int count = 0;
        for (String cell : cells) {
            if (!cell.isEmpty()) {
                count++;
            }
        }
        return count;
    }
}
