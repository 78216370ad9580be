package stirwright.exchange.internal.table;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import stirwright.exchange.DecimalSign;
import stirwright.exchange.UnusableFileException;

/**
 * A text table with its header: rows in the file's order, each at most as wide as the header or
 * flawed.
 *
 * @param decimalUnseen whether no number shows a decimal sign
 * @param messages what was found out about the file, a line each
 */
public record Grid(
        TextFile file, Header header, List<Row> rows, Separator separator, DecimalSign decimal, boolean decimalUnseen,
        List<String> messages) {

    /**
     * @param known columns whose names settle the separator, and whose cells hold no line breaks
     * @param numeric columns whose cells settle the decimal sign
     * @throws UnusableFileException without a header, or when the decimal sign cannot be told
     */
    public static Grid read(TextFile file, Predicate<String> known, Predicate<String> numeric) {
        Separator separator = separator(file, known);
        RowReader reader = new RowReader(file.text(), separator);
        Header header = new Header(firstRow(file, reader));
        return read(file, separator, header, reader, known, numeric);
    }

    /** The first row of a file under the separator that fits it best. */
    public static Row firstRow(TextFile file, Predicate<String> known) {
        return firstRow(file, new RowReader(file.text(), separator(file, known)));
    }

    /** A table without a header line, its columns called {@code column 1}, {@code column 2} and so on. */
    public static Grid readHeadless(TextFile file) {
        Separator separator = separator(file, name -> false);
        Row first = firstRow(file, new RowReader(file.text(), separator));
        List<String> names = new ArrayList<>();
        for (int i = 0; i < first.cells().size(); i++) {
            names.add("column " + (i + 1));
        }
        Header header = Header.of(names);
        return read(file, separator, header, new RowReader(file.text(), separator), name -> true, name -> true);
    }

    private static Grid read(
            TextFile file, Separator separator, Header header, RowReader reader, Predicate<String> known,
            Predicate<String> numeric) {
        boolean[] isKnown = flags(header, known);
        boolean[] isNumeric = flags(header, numeric);
        List<Row> rows = new ArrayList<>();
        DecimalVote vote = new DecimalVote();
        for (Optional<Row> next = reader.next(); next.isPresent(); next = reader.next()) {
            Row row = RowChecks.check(next.get(), header, isKnown, separator);
            if (RowChecks.mayHaveSwallowedLines(row, header, isKnown)) {
                reader.goOnAfter(row);
            }
            rows.add(row);
            for (int i = 0; i < isNumeric.length && row.flaw().isEmpty(); i++) {
                if (isNumeric[i]) {
                    vote.take(row.line(), header.nameAt(i), row.cell(i));
                }
            }
        }
        vote.tie().ifPresent(problem -> {
            throw new UnusableFileException(file.path(), problem);
        });
        String found = file.name() + ": " + separator.word() + " as separator, "
                + (vote.none() ? "no decimal sign in any number" : vote.winner().words());
        return new Grid(file, header, List.copyOf(rows), separator, vote.winner(), vote.none(), List.of(found));
    }

    private static Row firstRow(TextFile file, RowReader reader) {
        Row row = reader.next().orElseThrow(() -> new UnusableFileException(
                file.path(), "holds nothing but blank lines and comments; a header line and rows are expected"));
        row.flaw().ifPresent(flaw -> {
            throw new UnusableFileException(file.path(), "line " + row.line() + ", the header: cell "
                    + (flaw.cell() + 1) + " " + flaw.reason());
        });
        return row;
    }

    private static boolean[] flags(Header header, Predicate<String> which) {
        boolean[] flags = new boolean[header.names().size()];
        for (int i = 0; i < flags.length; i++) {
            flags[i] = which.test(header.names().get(i));
        }
        return flags;
    }

    /** Under the right separator the header shows most known names; without any, the order decides. */
    private static Separator separator(TextFile file, Predicate<String> known) {
        Separator best = Separator.COMMA;
        long most = -1;
        for (Separator separator : Separator.values()) {
            Optional<Row> row = new RowReader(file.text(), separator).next();
            List<String> cells = row.map(Row::cells).orElse(List.of());
            long score = 2 * cells.stream().filter(known).count() + (cells.size() > 1 ? 1 : 0);
            if (score > most) {
                best = separator;
                most = score;
            }
        }
        return best;
    }
}
