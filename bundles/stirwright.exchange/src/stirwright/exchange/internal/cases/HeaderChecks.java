package stirwright.exchange.internal.cases;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import stirwright.exchange.UnusableFileException;
import stirwright.exchange.internal.table.Header;
import stirwright.exchange.internal.table.TextFile;
import stirwright.exchange.internal.table.Texts;

/** Whether a header is one of a case table, and what a reader of messages should know about it. */
final class HeaderChecks {
    private final TextFile file;
    private final Header header;
    private final CaseColumns columns;

    HeaderChecks(TextFile file, Header header, CaseColumns columns) {
        this.file = file;
        this.header = header;
        this.columns = columns;
    }

    /** @throws UnusableFileException naming every column that is missing or stands twice */
    void require() {
        List<String> missing = new ArrayList<>();
        for (String column : CaseColumns.REQUIRED) {
            if (!header.has(column)) {
                missing.add("no column " + column + hint(column));
            }
        }
        if (CaseColumns.SPEEDS.stream().noneMatch(header::has)) {
            missing.add("none of the columns " + String.join(", ", CaseColumns.SPEEDS.stream().map(c -> c + hint(c)).toList()));
        }
        if (!missing.isEmpty()) {
            throw unusable("has " + String.join("; ", missing));
        }
        List<String> twice = header.names().stream()
                .filter(columns::isKnown)
                .filter(n -> header.names().indexOf(n) != header.names().lastIndexOf(n))
                .distinct()
                .toList();
        if (!twice.isEmpty()) {
            throw unusable("has column " + String.join(", ", twice) + " more than once; keep one");
        }
    }

    private UnusableFileException unusable(String problem) {
        return new UnusableFileException(file.path(), "the header on line " + header.line() + " " + problem);
    }

    private String hint(String column) {
        return header.names().stream().filter(column::equalsIgnoreCase).findFirst()
                .map(n -> " (write '" + n + "' as '" + column + "')").orElse("");
    }

    /** A line for each column that is not read. */
    List<String> messages() {
        List<String> messages = new ArrayList<>();
        int nameless = 0;
        for (String name : header.names()) {
            if (name.isEmpty()) {
                nameless++;
            } else if (!columns.isKnown(name)) {
                messages.add(file.name() + ": column '" + Texts.show(name) + "' is not known and is ignored"
                        + meant(name).map(c -> "; names are case-sensitive, did you mean '" + c + "'?").orElse(""));
            }
        }
        if (nameless > 0) {
            messages.add(file.name() + ": " + nameless + " column(s) without a name are ignored");
        }
        return messages;
    }

    private Optional<String> meant(String name) {
        return CaseColumns.ofContract().stream().filter(name::equalsIgnoreCase).findFirst();
    }
}
