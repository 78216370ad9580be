package stirwright.exchange.internal.table;

import java.util.Optional;
import stirwright.exchange.DecimalSign;

/** Finds a file's decimal sign: the one that more of its numbers show. Never guesses between equals. */
final class DecimalVote {
    private final int[] votes = new int[DecimalSign.values().length];
    private final String[] firstSeen = new String[votes.length];

    /** Takes a number, or the numbers behind the equal signs of a cell. */
    void take(int line, String column, String cell) {
        if (cell.indexOf('=') < 0) {
            takeNumber(line, column, cell);
            return;
        }
        String[] parts = cell.split("=\\s*");
        for (int i = 1; i < parts.length; i++) {
            takeNumber(line, column, parts[i].split("[\\s;]", 2)[0]);
        }
    }

    private void takeNumber(int line, String column, String cell) {
        for (DecimalSign sign : DecimalSign.values()) {
            if (Numbers.shows(cell, sign) && votes[sign.ordinal()]++ == 0) {
                firstSeen[sign.ordinal()] = "line " + line + " " + column + " '" + Texts.show(cell) + "'";
            }
        }
    }

    /** Whether no number shows a decimal sign, so that any reads the same. */
    boolean none() {
        return votes[0] + votes[1] == 0;
    }

    DecimalSign winner() {
        return votes[DecimalSign.COMMA.ordinal()] > votes[DecimalSign.POINT.ordinal()]
                ? DecimalSign.COMMA : DecimalSign.POINT;
    }

    /** What makes the file unusable: as many of one as of the other. */
    Optional<String> tie() {
        return none() || votes[0] != votes[1] ? Optional.empty()
                : Optional.of("decimal point and decimal comma occur equally often, for instance " + firstSeen[0]
                        + " and " + firstSeen[1] + "; use one of them throughout");
    }
}
