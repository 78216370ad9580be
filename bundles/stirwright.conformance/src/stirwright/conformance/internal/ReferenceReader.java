package stirwright.conformance.internal;

import de.siegmar.fastcsv.reader.CommentStrategy;
import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import java.util.ArrayList;
import java.util.List;
import stirwright.conformance.ReferenceFile;

/** Reads reference files; what cannot be read becomes a problem and stops no other row. */
final class ReferenceReader {
    private static final String BYTE_ORDER_MARK = "\uFEFF";
    private static final String PROVENANCE = "#";

    private final Workpiece workpiece;
    private final List<ReferenceRow> rows = new ArrayList<>();
    private final List<ReferenceRows.Lack> lacks = new ArrayList<>();
    private final List<ReferenceRows.Problem> problems = new ArrayList<>();

    private ReferenceReader(Workpiece workpiece) {
        this.workpiece = workpiece;
    }

    static ReferenceRows read(Workpiece workpiece, List<ReferenceFile> files) {
        ReferenceReader reader = new ReferenceReader(workpiece);
        files.forEach(reader::read);
        return new ReferenceRows(List.copyOf(reader.rows), List.copyOf(reader.lacks), List.copyOf(reader.problems));
    }

    private void read(ReferenceFile file) {
        String text = file.text().startsWith(BYTE_ORDER_MARK) ? file.text().substring(1) : file.text();
        if (!text.lines().takeWhile(line -> line.startsWith(PROVENANCE)).anyMatch(line -> line.length() > 2)) {
            problem(file.name(), "has no provenance; start it with lines '# ...' that say where the numbers come from");
        }
        List<CsvRecord> records = new ArrayList<>();
        try {
            CsvReader.builder().commentStrategy(CommentStrategy.SKIP).ofCsvRecord(text).forEach(records::add);
        } catch (CsvParseException unreadable) {
            problem(file.name(), "cannot be read: " + message(unreadable));
        }
        if (records.isEmpty()) {
            problem(file.name(), "has no header");
            return;
        }
        Legend legend = Legend.of(text);
        Columns columns = Columns.of(records.get(0).getFields(), workpiece);
        columns.problems().forEach(message -> problem(file.name(), message));
        for (CsvRecord each : records.subList(1, records.size())) {
            String place = file.name() + " line " + each.getStartingLineNumber();
            try {
                RowReader row = new RowReader(workpiece, columns, legend, each.getFields());
                row.lack().ifPresentOrElse(lacks::add, () -> rows.add(row.read(place)));
            } catch (RowException unreadable) {
                problem(place, unreadable.getMessage());
            }
        }
    }

    private void problem(String place, String message) {
        problems.add(new ReferenceRows.Problem(place, message));
    }

    private static String message(CsvParseException failure) {
        return failure.getCause() == null ? failure.getMessage() : failure.getCause().getMessage();
    }
}
