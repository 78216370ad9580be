package stirwright.exchange.internal.table;

import java.util.List;
import java.util.Optional;

/**
 * One row of a table.
 *
 * @param line of the file on which it begins, from 1
 * @param cells trimmed; up to the flaw if there is one
 * @param spansLines whether a cell holds a line break
 * @param flaw what keeps it from being read
 */
public record Row(int line, List<String> cells, boolean spansLines, Optional<Flaw> flaw) {

    /**
     * A cell that cannot be read.
     *
     * @param cell its position, from 0
     * @param value the beginning of what stands there; may be empty
     * @param reason what is wrong, to follow the column's name
     */
    public record Flaw(int cell, String value, String reason) {}

    /** The cell's text; empty beyond the last. */
    public String cell(int at) {
        return at >= 0 && at < cells.size() ? cells.get(at) : "";
    }

    public boolean blank() {
        return flaw.isEmpty() && cells.stream().allMatch(String::isEmpty);
    }

    Row onLine(int lineOfFile) {
        return new Row(lineOfFile, cells, spansLines, flaw);
    }

    Row flawed(Flaw found) {
        return new Row(line, cells, spansLines, Optional.of(found));
    }
}
