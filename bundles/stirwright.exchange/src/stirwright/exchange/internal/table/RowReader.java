package stirwright.exchange.internal.table;

import de.siegmar.fastcsv.reader.CommentStrategy;
import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.FieldMismatchStrategy;
import java.io.IOException;
import java.io.StringReader;
import java.io.UncheckedIOException;
import java.util.Iterator;
import java.util.Optional;

/**
 * Splits a text into rows. A row that cannot be split comes with its flaw, and reading goes on with
 * the next line, so that one stray quote does not swallow the rest of the file.
 */
final class RowReader {

    /** Characters that one cell may take before the parser gives up; bounds the memory, not the text. */
    private static final int BUFFER = 16 << 20;

    private final String text;
    private final Separator separator;
    /** Where the parser at work began: offset in the text, and lines before it. */
    private int offset;
    private int linesBefore;
    private RowHandler handler;
    private Iterator<Row> rows;

    RowReader(String text, Separator separator) {
        this.text = text;
        this.separator = separator;
        parseFromHere();
    }

    /** The next row that is neither blank nor a comment; empty at the end of the text. */
    Optional<Row> next() {
        try {
            while (rows.hasNext()) {
                Row row = rows.next();
                if (!row.blank()) {
                    return Optional.of(row.onLine(row.line() + linesBefore));
                }
            }
            return Optional.empty();
        } catch (CsvParseException unsplittable) {
            return afterFailure();
        }
    }

    private Optional<Row> afterFailure() {
        Row part = handler.row();
        Row row = part.onLine(part.line() + linesBefore);
        int begin = begin(row);
        boolean endless = afterLine(begin) - begin > BUFFER;
        goOnAfter(row);
        if (text.charAt(begin) == '#') {
            return next();
        }
        return Optional.of(row.flaw().isPresent() ? row : row.flawed(new Row.Flaw(row.cells().size(), "", endless
                ? "is more than " + RowHandler.MOST_CHARACTERS + " characters long"
                : "begins with a quote that is not closed, or has text after the closing quote")));
    }

    /** Reads on with the line after the one on which this row, the last one returned, begins. */
    void goOnAfter(Row row) {
        if (row.line() <= linesBefore) {
            return;
        }
        offset = afterLine(begin(row));
        linesBefore = row.line();
        parseFromHere();
    }

    private int begin(Row row) {
        int at = offset;
        for (int lines = row.line() - linesBefore - 1; lines > 0; lines--) {
            at = afterLine(at);
        }
        return at;
    }

    private int afterLine(int from) {
        int at = from;
        while (at < text.length() && !isBreak(text.charAt(at))) {
            at++;
        }
        boolean two = at + 1 < text.length() && text.charAt(at) == '\r' && text.charAt(at + 1) == '\n';
        return Math.min(text.length(), two ? at + 2 : at + 1);
    }

    private static boolean isBreak(char c) {
        return c == '\n' || c == '\r';
    }

    private void parseFromHere() {
        handler = new RowHandler();
        StringReader source = new StringReader(text);
        try {
            source.skip(offset);
        } catch (IOException impossible) {
            throw new UncheckedIOException(impossible);
        }
        rows = CsvReader.builder()
                .fieldSeparator(separator.sign())
                .commentStrategy(CommentStrategy.SKIP)
                .missingFieldStrategy(FieldMismatchStrategy.IGNORE)
                .extraFieldStrategy(FieldMismatchStrategy.IGNORE)
                .trimWhitespacesAroundQuotes(true)
                .allowUnclosedQuote(false)
                .maxBufferSize(BUFFER)
                .build(handler, source)
                .iterator();
    }
}
