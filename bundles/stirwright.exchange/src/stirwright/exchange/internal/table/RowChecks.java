package stirwright.exchange.internal.table;

/** Finds rows that do not fit under the header. */
final class RowChecks {

    private RowChecks() {}

    static Row check(Row row, Header header, boolean[] known, Separator separator) {
        if (row.flaw().isPresent()) {
            return row;
        }
        for (int i = 0; row.spansLines() && i < row.cells().size(); i++) {
            if (i < known.length && known[i] && holdsBreak(row.cell(i))) {
                return row.flawed(new Row.Flaw(i, row.cell(i), complete(row, header)
                        ? "holds a line break; this column takes one line"
                        : "begins with a quote that is not closed on its line"));
            }
        }
        int width = header.names().size();
        if (row.cells().size() > width) {
            // Blank ones too: an unquoted decimal comma shifts every cell after it, to the blank end of a row.
            return row.flawed(new Row.Flaw(width, row.cell(width), "has no column: the row has " + row.cells().size()
                    + " cells, the header " + width
                    + hint(separator)));
        }
        return row;
    }

    private static String hint(Separator separator) {
        return switch (separator) {
            case COMMA -> "; between commas a decimal comma needs quotes";
            case SEMICOLON -> "; between semicolons a cell that holds one needs quotes";
            case TAB -> "";
        };
    }

    /**
     * Whether a quote may have been taken for one that spans lines, which hold rows of their own. A
     * remark may span lines as it likes, in a column that is not read.
     */
    static boolean mayHaveSwallowedLines(Row row, Header header, boolean[] known) {
        return row.spansLines() && !complete(row, header) && row.flaw().filter(f -> f.cell() >= known.length || known[f.cell()]).isPresent();
    }

    /** A quote that swallowed rows leaves a cell count that only chance makes right. */
    private static boolean complete(Row row, Header header) {
        return row.cells().size() == header.names().size();
    }

    private static boolean holdsBreak(String cell) {
        return cell.indexOf('\n') >= 0 || cell.indexOf('\r') >= 0;
    }
}
