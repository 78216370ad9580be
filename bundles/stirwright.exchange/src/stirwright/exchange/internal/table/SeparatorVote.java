package stirwright.exchange.internal.table;

import java.util.List;
import stirwright.exchange.CurveSeparator;

/**
 * Which separator leaves the most numbers alone in their cells.
 *
 * @param reason how clear it is
 */
public record SeparatorVote(CurveSeparator winner, String reason) {
    /** Enough of a text to tell, in characters. */
    private static final int SAMPLE = 100_000;
    /** What a cell of a row without numbers counts. */
    private static final double TRIFLE = 1e-6;

    public static SeparatorVote of(String text) {
        String sample = text.length() > SAMPLE ? text.substring(0, Math.max(text.lastIndexOf('\n', SAMPLE), SAMPLE / 2)) : text;
        CurveSeparator best = CurveSeparator.TAB;
        double most = -1;
        int lines = 0;
        int fitting = 0;
        for (CurveSeparator separator : CurveSeparator.values()) {
            double score = 0;
            int rows = 0;
            int several = 0;
            for (SourceRow row : CellSplitter.split(sample, separator, SAMPLE)) {
                double share = share(row.cells());
                score += share;
                several += share > TRIFLE * row.cells().size() ? 1 : 0;
                rows += row.blank() ? 0 : 1;
            }
            if (score > most) {
                best = separator;
                most = score;
                lines = rows;
                fitting = several;
            }
        }
        return new SeparatorVote(best, "it leaves whole numbers in several cells on " + fitting + " of " + lines + " lines");
    }

    /** Of the cells that are filled, those that are numbers; a trifle for rows of words alone. */
    private static double share(List<String> cells) {
        int filled = 0;
        int numbers = 0;
        for (String cell : cells) {
            if (!cell.isEmpty()) {
                filled++;
                numbers += Numbers.isNumber(cell) ? 1 : 0;
            }
        }
        return filled < 2 ? 0 : Math.max((double) numbers / filled, TRIFLE * filled);
    }
}
