package stirwright.exchange.internal.curves;

import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import stirwright.exchange.CurveSeparator;
import stirwright.exchange.DecimalSign;
import stirwright.exchange.Finding;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.internal.table.Numbers;
import stirwright.exchange.internal.table.Texts;

/**
 * The decimal sign: the one that more numbers show. Between equals nothing is guessed.
 *
 * @param tie why it cannot be told; empty when it can
 * @param doubts a sentence each
 */
record SignVote(DecimalSign sign, Finding finding, Optional<String> tie, List<String> doubts) {
    /** What a thousands sign looks like as well. */
    private static final Pattern THOUSANDS = Pattern.compile("[+-]?[1-9][0-9]{0,2}(?:[.,][0-9]{3})+");

    static SignVote of(List<Stretch> stretches, ImportChoice choice, CurveSeparator separator) {
        Count count = new Count();
        for (Stretch stretch : stretches) {
            for (WorkRow row : stretch.rows) {
                for (Column column : stretch.group.columns().values()) {
                    if (column.quantity().measured()) {
                        count.take(row, column);
                    }
                }
            }
        }
        return choice.decimalSign().map(s -> new SignVote(s, finding(s.words(), "chosen by hand", true), Optional.empty(), List.of()))
                .orElseGet(() -> count.result(stretches, separator));
    }

    private static Finding finding(String value, String reason, boolean overruled) {
        return new Finding(Finding.Topic.DECIMAL_SIGN, value, reason, overruled);
    }

    private static final class Count {
        private final int[] votes = new int[2];
        private final int[] likeThousands = new int[2];
        private final String[] first = new String[2];
        private int typed;

        void take(WorkRow row, Column column) {
            String cell = row.row.cell(column.position());
            if (row.row.isTyped(column.position())) {
                typed++;
                return;
            }
            for (DecimalSign sign : DecimalSign.values()) {
                if (Numbers.shows(cell, sign)) {
                    int at = sign.ordinal();
                    likeThousands[at] += THOUSANDS.matcher(cell).matches() ? 1 : 0;
                    if (votes[at]++ == 0) {
                        first[at] = (row.sheet.isEmpty() ? "" : "sheet '" + row.sheet + "', ") + "line " + row.row.line() + " "
                                + column.name() + " '" + Texts.show(cell) + "'";
                    }
                }
            }
        }

        SignVote result(List<Stretch> stretches, CurveSeparator separator) {
            if (votes[0] + votes[1] == 0) {
                return new SignVote(DecimalSign.POINT, typed > 0
                        ? finding("none needed", "the workbook holds its numbers as numbers", false)
                        : finding("none seen", "no number shows one, so both read the same", false), Optional.empty(), List.of());
            }
            int winner = votes[1] > votes[0] ? 1 : 0;
            DecimalSign sign = DecimalSign.values()[winner];
            String seen = votes[winner] + " numbers show it, " + votes[1 - winner] + " the other, for instance " + first[winner];
            if (votes[0] == votes[1]) {
                return new SignVote(sign, finding("cannot be told", seen, false), Optional.of(
                        "decimal point and decimal comma occur equally often, for instance " + first[0] + " and " + first[1]
                                + "; choose the decimal sign, or use one of them throughout"), List.of());
            }
            if (votes[winner] == likeThousands[winner] && votes[1 - winner] == 0 && separator == CurveSeparator.COMMA && sign == DecimalSign.POINT) {
                return new SignVote(sign, finding(sign.words(), seen + "; commas stand between the cells", false), Optional.empty(),
                        List.of("every number with a point has three digits behind it, for instance " + first[winner]
                                + ": it is read as decimal point, since commas stand between the cells; write thousands without a sign"));
            }
            if (votes[winner] == likeThousands[winner] && !shownBeside(stretches, sign)) {
                return new SignVote(sign, finding("cannot be told", seen, false), Optional.of("every number with a " + (winner == 0 ? "point"
                        : "comma") + " has three digits behind it, for instance " + first[winner] + ", so it may be a decimal sign or part"
                        + " thousands; choose the " + sign.words() + ", or write the numbers without a thousands sign"), List.of());
            }
            return new SignVote(sign, finding(sign.words(), seen, false), Optional.empty(), doubts(winner, sign));
        }

        /** Whether any cell beside, also of a column that is not read, shows the sign where no thousands sign can stand. */
        private static boolean shownBeside(List<Stretch> stretches, DecimalSign sign) {
            return stretches.stream().flatMap(s -> s.rows.stream()).flatMap(r -> r.row.cells().stream())
                    .anyMatch(c -> Numbers.shows(c, sign) && !THOUSANDS.matcher(c).matches());
        }

        private List<String> doubts(int winner, DecimalSign sign) {
            return votes[1 - winner] == 0 ? List.of() : List.of(votes[1 - winner] + " numbers show a " + sign.other().words()
                    + ", for instance " + first[1 - winner] + ", and are not read, since " + votes[winner] + " show a " + sign.words());
        }
    }
}
