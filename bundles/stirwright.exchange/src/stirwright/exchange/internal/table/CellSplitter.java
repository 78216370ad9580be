package stirwright.exchange.internal.table;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.regex.Pattern;
import stirwright.exchange.CurveSeparator;

/**
 * Splits a text into rows and cells, blank rows included. A cell in quotes may hold separators and, as spreadsheets
 * copy them, a few line breaks; a quote that is not closed is a character like any other.
 */
public final class CellSplitter {
    /** Room for a header in several lines; a stray quote swallows no more than this. */
    private static final int LONGEST_QUOTED = 500;
    private static final Pattern GAP = Pattern.compile("[ \\t]{2,}|\\t");
    private static final Pattern SPACE = Pattern.compile("[ \\t]+");

    private final String text;
    private final char separator;
    private final int mostCells;
    private final List<SourceRow> rows = new ArrayList<>();
    private int at;
    private int line = 1;
    private int count;

    private CellSplitter(String text, char separator, int mostCells) {
        this.text = text;
        this.separator = separator;
        this.mostCells = mostCells;
    }

    /**
     * @param mostCells after which splitting stops
     * @return as many rows as hold that many cells
     */
    public static List<SourceRow> split(String text, CurveSeparator separator, int mostCells) {
        CellSplitter splitter = new CellSplitter(text, switch (separator) {
            case TAB -> '\t';
            case SEMICOLON -> ';';
            case COMMA -> ',';
            case BAR -> '|';
            case SPACES -> '\n';
        }, mostCells);
        splitter.run();
        return separator == CurveSeparator.SPACES ? splitter.rows.stream().map(CellSplitter::bySpaces).toList() : splitter.rows;
    }

    private void run() {
        while (at < text.length() && count < mostCells) {
            int begin = line;
            List<String> cells = new ArrayList<>(rows.isEmpty() ? 4 : Math.max(1, rows.getLast().cells().size()));
            do {
                cells.add(cell());
            } while (skipSeparator());
            skipBreak();
            line++;
            count += cells.size();
            rows.add(new SourceRow(begin, cells, null));
        }
    }

    private boolean skipSeparator() {
        boolean there = at < text.length() && text.charAt(at) == separator && separator != '\n';
        at += there ? 1 : 0;
        return there;
    }

    private void skipBreak() {
        boolean two = at + 1 < text.length() && text.charAt(at) == '\r' && text.charAt(at + 1) == '\n';
        at += two ? 2 : 1;
    }

    private String cell() {
        int from = at;
        while (from < text.length() && text.charAt(from) == ' ') {
            from++;
        }
        if (from < text.length() && text.charAt(from) == '"' && separator != '\n') {
            int close = closing(from + 1);
            if (close >= 0) {
                String inside = text.substring(from + 1, close).replace("\"\"", "\"");
                line += (int) inside.chars().filter(c -> c == '\n').count();
                return Texts.trim(inside.replaceAll("\\s*\\R\\s*", " "));
            }
        }
        int to = at;
        while (to < text.length() && text.charAt(to) != separator && text.charAt(to) != '\n' && text.charAt(to) != '\r') {
            to++;
        }
        String cell = Texts.trim(text.substring(at, to));
        at = to;
        return cell;
    }

    /**
     * The closing quote of a cell, with {@link #at} moved behind it; -1 when there is none. A cell that holds both a line
     * break and a separator is no cell but rows that a stray quote would swallow.
     */
    private int closing(int from) {
        int end = Math.min(text.length(), from + LONGEST_QUOTED);
        boolean broken = false;
        boolean parted = false;
        for (int i = from; i < end && !(broken && parted); i++) {
            broken |= text.charAt(i) == '\n' || text.charAt(i) == '\r';
            parted |= text.charAt(i) == separator;
            if (text.charAt(i) != '"') {
                continue;
            }
            if (i + 1 < text.length() && text.charAt(i + 1) == '"') {
                i++;
                continue;
            }
            int after = i + 1;
            while (after < text.length() && text.charAt(after) == ' ') {
                after++;
            }
            if (after == text.length() || text.charAt(after) == separator || text.charAt(after) == '\n'
                    || text.charAt(after) == '\r') {
                at = after;
                return i;
            }
            return -1;
        }
        return -1;
    }

    /** Names of columns hold single spaces; numbers do not. */
    private static SourceRow bySpaces(SourceRow whole) {
        String text = whole.cell(0);
        String[] words = SPACE.split(text);
        boolean single = text.indexOf('_') >= 0 || Arrays.stream(words).allMatch(Numbers::isNumber);
        return new SourceRow(whole.line(), List.of(single ? words : GAP.split(text)), null);
    }
}
