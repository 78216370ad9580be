package stirwright.exchange;

import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import stirwright.core.Catalogue;
import stirwright.exchange.internal.cases.CaseRows;
import stirwright.exchange.internal.table.TextFile;
import stirwright.study.StudyFiles;

/**
 * The cases of a file, a table or a study: one entry a row or case, each a case or the reason why it is
 * none. Immutable. The columns and their units are described in the product's help on tables.
 */
public final class CaseTable {
    /** How a study begins, and no table. */
    private static final String XML = "<?xml";

    private final String fileName;
    private final List<CaseEntry> entries;
    private final List<String> messages;

    CaseTable(String fileName, List<CaseEntry> entries, List<String> messages) {
        this.fileName = fileName;
        this.entries = List.copyOf(entries);
        this.messages = List.copyOf(messages);
    }

    /**
     * Reads a table: UTF-8; comma, semicolon or tab; decimal point or decimal comma. Or a study, told by its ending or
     * by what it begins with.
     *
     * @param catalogue the families whose dimensions are columns
     * @throws UnusableFileException when the file cannot be read, or is no case table and no study; a row
     *     that is no case is an entry with a refusal instead
     */
    public static CaseTable read(Path file, Catalogue catalogue) {
        if (isNamedAsStudy(file)) {
            return StudyCases.read(file, catalogue);
        }
        TextFile text = TextFile.read(file);
        if (text.text().startsWith(XML)) {
            return StudyCases.read(file, catalogue);
        }
        CaseRows rows = CaseRows.open(text, catalogue);
        List<CaseEntry> entries = rows.cells().map(cells -> CaseEntry.of(rows.reader(), cells)).toList();
        return new CaseTable(text.name(), entries, rows.messages());
    }

    /** The ending alone is a constant of the compiler: a table needs nothing of what studies are made with. */
    private static boolean isNamedAsStudy(Path file) {
        return file.toString().toLowerCase(Locale.ROOT).endsWith(StudyFiles.ENDING);
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
