package stirwright.exchange;

import java.util.List;

/**
 * A row of the source as text, to be shown beside what was made of it.
 *
 * @param sheet of a workbook; empty for text
 * @param line on which it begins, from 1
 * @param cells without spaces at their ends
 * @param block number of the block that it belongs to; 0 for none
 */
public record RawRow(String sheet, int line, List<String> cells, Kind kind, int block) {

    /** What a row is. */
    public enum Kind {
        BLANK("blank"),
        NAMES("names of columns"),
        UNITS("units"),
        /** The head of a block, of an interval or of a sample. */
        BLOCK("head of a block"),
        NOTE("note"),
        POINT("point");

        private final String words;

        Kind(String words) {
            this.words = words;
        }

        public String words() {
            return words;
        }
    }

    /** The cell's text; empty beyond the last. */
    public String cell(int at) {
        return at >= 0 && at < cells.size() ? cells.get(at) : "";
    }
}
