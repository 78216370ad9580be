package stirwright.exchange.internal.table;

import java.util.List;

/**
 * The rows of a text or of one sheet of a workbook.
 *
 * @param name empty for text
 * @param hidden whether a spreadsheet does not show it
 * @param hiddenRows lines of rows that a spreadsheet does not show; they are left out
 */
public record SourceSheet(String name, List<SourceRow> rows, boolean hidden, List<Integer> hiddenRows) {

    public SourceSheet(String name, List<SourceRow> rows) {
        this(name, rows, false, List.of());
    }
}
