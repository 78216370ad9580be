package stirwright.exchange;

import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;
import stirwright.exchange.internal.curves.Importer;

/**
 * All that was found in a source: what it is, its rows, its blocks and the curves that come of them.
 * Nothing is dropped without a reason that stands here. Immutable.
 *
 * @param rows every row of the source, in order
 * @param blocks in the order of the source, those that are not taken included
 * @param dropped every point that is in no curve for a reason of its own, of all blocks
 * @param curves of the blocks that are taken; may be empty, {@link #messages()} say why then
 */
public record CurveImport(
        CurveSource source, ImportChoice choice, List<Finding> findings, List<RawRow> rows, List<CurveBlock> blocks,
        List<DroppedPoint> dropped, ImportCounts counts, List<ImportMessage> messages, List<MeasuredCurve> curves) {

    public CurveImport {
        findings = List.copyOf(findings);
        rows = List.copyOf(rows);
        blocks = List.copyOf(blocks);
        dropped = List.copyOf(dropped);
        messages = List.copyOf(messages);
        curves = List.copyOf(curves);
    }

    /**
     * Reads a source.
     *
     * @throws UnusableFileException when nothing can be shown of it: an old or broken workbook, a picture, bytes that
     *     are no text. A text without curves is no exception: {@link #curves()} is empty then
     */
    public static CurveImport of(CurveSource source, ImportChoice choice) {
        return Importer.read(source, choice);
    }

    /**
     * The curves, at least one.
     *
     * @throws UnusableFileException when there is none, with the problem that comes first
     */
    public List<MeasuredCurve> requireCurves() {
        if (curves.isEmpty()) {
            throw new UnusableFileException(source.shown(), messages.stream()
                    .filter(m -> m.weight() == ImportMessage.Weight.PROBLEM).map(ImportMessage::words).findFirst()
                    .orElse("holds no flow curve"));
        }
        return curves;
    }

    /** Findings and messages, a line each with the file's name before it; what weighs most comes last, marked by a word. */
    public List<String> report() {
        return Stream.concat(findings.stream().map(Finding::words),
                        messages.stream().sorted(Comparator.comparing(ImportMessage::weight)).map(ImportMessage::marked))
                .map(line -> source.name() + ": " + line).toList();
    }
}
