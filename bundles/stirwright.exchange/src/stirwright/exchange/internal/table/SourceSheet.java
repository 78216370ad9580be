package stirwright.exchange.internal.table;

import java.util.List;

/**
 * The rows of a text or of one sheet of a workbook.
 *
 * @param name empty for text
 */
public record SourceSheet(String name, List<SourceRow> rows) {}
