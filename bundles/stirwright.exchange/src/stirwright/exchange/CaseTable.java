package stirwright.exchange;

import java.nio.file.Path;
import java.util.List;
import stirwright.core.Catalogue;
import stirwright.exchange.internal.cases.CaseReader;
import stirwright.exchange.internal.table.TextFile;

/**
 * A case table that was read from a file: one entry a row, each a case or the reason why it is none.
 * Immutable. The columns and their units are described in the product's help on tables.
 */
public final class CaseTable {
    private final String fileName;
    private final List<CaseEntry> entries;
    private final List<String> messages;

    private CaseTable(String fileName, List<CaseEntry> entries, List<String> messages) {
        this.fileName = fileName;
        this.entries = entries;
        this.messages = messages;
    }

    /**
     * Reads a table: UTF-8; comma, semicolon or tab; decimal point or decimal comma.
     *
     * @param catalogue the families whose dimensions are columns
     * @throws UnusableFileException when the file cannot be read or is no case table; a row that is
     *     no case is an entry with a refusal instead
     */
    public static CaseTable read(Path file, Catalogue catalogue) {
        TextFile text = TextFile.read(file);
        CaseReader reader = CaseReader.open(text, catalogue);
        List<CaseEntry> entries = reader.rows().stream().map(row -> CaseEntry.of(reader, reader.cells(row))).toList();
        return new CaseTable(text.name(), entries, List.copyOf(reader.messages()));
    }

    /** Without the folder. */
    public String fileName() {
        return fileName;
    }

    /** In the order of the file. */
    public List<CaseEntry> entries() {
        return entries;
    }

    /** What was found out about the file and what was ignored in it, a line each. */
    public List<String> messages() {
        return messages;
    }
}
