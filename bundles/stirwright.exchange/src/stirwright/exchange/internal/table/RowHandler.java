package stirwright.exchange.internal.table;

import de.siegmar.fastcsv.reader.AbstractBaseCsvCallbackHandler;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Collects the cells of a row, and keeps no more of an endless cell or row than a message needs. */
final class RowHandler extends AbstractBaseCsvCallbackHandler<Row> {

    /** In characters; no name, number or remark of a table is longer. */
    static final int MOST_CHARACTERS = 10_000;
    static final int MOST_CELLS = 10_000;
    private static final int KEPT = 100;

    private List<String> cells = new ArrayList<>();
    private Optional<Row.Flaw> flaw = Optional.empty();
    private boolean spansLines;
    private int line;

    @Override
    protected void handleBegin(long startingLine) {
        line = (int) startingLine;
        cells = new ArrayList<>(Math.max(cells.size(), 1));
        flaw = Optional.empty();
        spansLines = false;
    }

    @Override
    protected void handleField(int index, char[] buffer, int offset, int length, boolean quoted) {
        spansLines |= quoted && holdsBreak(buffer, offset, length);
        if (flaw.isPresent()) {
            return;
        }
        if (length > MOST_CHARACTERS) {
            flaw = Optional.of(new Row.Flaw(index, new String(buffer, offset, KEPT),
                    "is " + length + " characters long; at most " + MOST_CHARACTERS + " are read"));
        } else if (index >= MOST_CELLS) {
            flaw = Optional.of(new Row.Flaw(index, "", "is beyond the " + MOST_CELLS + " cells that are read"));
        } else {
            cells.add(Texts.trim(new String(buffer, offset, length)));
        }
    }

    private static boolean holdsBreak(char[] buffer, int offset, int length) {
        for (int i = offset; i < offset + length; i++) {
            if (buffer[i] == '\n' || buffer[i] == '\r') {
                return true;
            }
        }
        return false;
    }

    @Override
    protected Row buildRecord() {
        return row();
    }

    /** The row so far; what is left of it when the parser gave up. */
    Row row() {
        return new Row(line, cells, spansLines, flaw);
    }
}
