package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import stirwright.exchange.CurveSeparator;
import stirwright.exchange.CurveSource;
import stirwright.exchange.Finding;
import stirwright.exchange.Finding.Topic;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.UnusableFileException;
import stirwright.exchange.internal.table.CellSplitter;
import stirwright.exchange.internal.table.FileSignature;
import stirwright.exchange.internal.table.SeparatorVote;
import stirwright.exchange.internal.table.SourceRow;
import stirwright.exchange.internal.table.SourceSheet;
import stirwright.exchange.internal.table.TextEncoding;
import stirwright.exchange.internal.workbook.Workbook;

/**
 * A source as rows of cells.
 *
 * @param separator null for a workbook
 * @param notes what is left out, a sentence each
 */
record Sources(List<SourceSheet> sheets, CurveSeparator separator, List<Finding> findings, List<String> notes) {
    /** Room for 100,000 rows of 12 columns; what the 320 MB that the start script gives can hold. */
    private static final int MOST_CELLS = 1_200_000;

    /** @throws UnusableFileException when it is neither text nor a workbook that can be read */
    static Sources read(CurveSource source, ImportChoice choice) {
        byte[] bytes = source.bytes();
        FileSignature.Kind kind = source.pasted() ? FileSignature.Kind.TEXT : FileSignature.of(bytes);
        return switch (kind) {
            case ZIP -> workbook(source, bytes, choice);
            case OLD_WORKBOOK -> throw new UnusableFileException(source.shown(), "is a workbook in an old binary format, or one with a"
                    + " password; save it as .xlsx or as CSV in UTF-8");
            case PDF -> throw new UnusableFileException(source.shown(), "is a PDF document; save its table as .xlsx or as CSV in UTF-8");
            case WEB_PAGE -> throw new UnusableFileException(source.shown(), "is a web page (HTML or XML), whatever its name ends in; open it"
                    + " in a spreadsheet and save it as .xlsx or as CSV in UTF-8");
            case IMAGE -> throw new UnusableFileException(source.shown(), "is a picture; type its numbers, or save the table as .xlsx or"
                    + " as CSV in UTF-8");
            case TEXT -> text(source, bytes, choice);
        };
    }

    private static Sources workbook(CurveSource source, byte[] bytes, ImportChoice choice) {
        List<SourceSheet> all = Workbook.read(source.shown(), bytes, MOST_CELLS);
        List<SourceSheet> read = all.stream().filter(s -> choice.sheets().isEmpty() ? !s.hidden() : choice.sheets().contains(s.name())).toList();
        List<String> names = all.stream().map(SourceSheet::name).toList();
        if (read.isEmpty() && choice.sheets().isEmpty()) {
            throw new UnusableFileException(source.shown(), "has hidden sheets alone (" + String.join(", ", names)
                    + "); show the one with the flow curve in a spreadsheet and save it again, or choose it");
        }
        if (read.isEmpty()) {
            throw new UnusableFileException(source.shown(), "has no sheet '" + String.join("' or '", choice.sheets())
                    + "'; its sheets are " + String.join(", ", names));
        }
        List<String> notes = new ArrayList<>();
        all.stream().filter(s -> s.hidden() && !read.contains(s))
                .forEach(s -> notes.add("sheet '" + s.name() + "' is hidden: not read; choose it to read it"));
        read.stream().filter(s -> !s.hiddenRows().isEmpty()).forEach(s -> notes.add("sheet '" + s.name() + "': "
                + s.hiddenRows().size() + (s.hiddenRows().size() == 1 ? " hidden row" : " hidden rows") + " (the first is row "
                + s.hiddenRows().get(0) + ") not read; show them in a spreadsheet to have them read"));
        boolean chosen = !choice.sheets().isEmpty();
        return new Sources(read, null, List.of(
                new Finding(Topic.FORM, "workbook", "its bytes say so", false),
                new Finding(Topic.SHEETS, String.join(", ", read.stream().map(SourceSheet::name).toList()),
                        chosen ? "chosen by hand of " + String.join(", ", names) : "all that are shown are looked through", chosen)), notes);
    }

    private static Sources text(CurveSource source, byte[] bytes, ImportChoice choice) {
        List<Finding> findings = new ArrayList<>(List.of(
                new Finding(Topic.FORM, source.pasted() ? "text from the clipboard" : "text", "its bytes say so", false)));
        Optional<String> name = source.pasted() ? Optional.empty() : choice.encoding();
        TextEncoding encoding = name.map(n -> TextEncoding.chosen(source.shown(), bytes, n))
                .orElseGet(() -> TextEncoding.detect(source.shown(), bytes));
        if (!source.pasted()) {
            findings.add(new Finding(Topic.ENCODING, encoding.name(), encoding.reason(), name.isPresent()));
        }
        SeparatorVote vote = choice.separator().map(s -> new SeparatorVote(s, "chosen by hand"))
                .orElseGet(() -> SeparatorVote.of(encoding.text()));
        findings.add(new Finding(Topic.SEPARATOR, vote.winner().word(), vote.reason(), choice.separator().isPresent()));
        List<SourceRow> rows = CellSplitter.split(encoding.text(), vote.winner(), MOST_CELLS);
        if (rows.stream().mapToInt(r -> r.cells().size()).sum() >= MOST_CELLS) {
            throw new UnusableFileException(source.shown(), "has more than " + MOST_CELLS + " cells; split it");
        }
        return new Sources(List.of(new SourceSheet("", rows)), vote.winner(), findings, List.of());
    }
}
