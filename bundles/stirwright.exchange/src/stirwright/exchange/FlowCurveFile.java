package stirwright.exchange;

import java.nio.file.Path;
import java.util.List;
import stirwright.exchange.internal.curves.CurveReader;
import stirwright.exchange.internal.table.TextFile;

/**
 * A measured flow curve from a text table: shear rate in 1/s and shear stress in Pa, with or without
 * a header. Immutable.
 */
public final class FlowCurveFile {
    private final String fileName;
    private final List<MeasuredCurve> curves;
    private final List<String> messages;

    private FlowCurveFile(String fileName, List<MeasuredCurve> curves, List<String> messages) {
        this.fileName = fileName;
        this.curves = curves;
        this.messages = messages;
    }

    /**
     * Reads a file: UTF-8; comma, semicolon or tab; decimal point or decimal comma. The columns are
     * told by their names, or are the first two that hold numbers.
     *
     * @throws UnusableFileException naming the line, column and value that cannot be used
     */
    public static FlowCurveFile read(Path file) {
        TextFile text = TextFile.read(file);
        CurveReader reader = CurveReader.read(text);
        int dot = text.name().lastIndexOf('.');
        String label = dot > 0 ? text.name().substring(0, dot) : text.name();
        return new FlowCurveFile(text.name(), List.of(MeasuredCurve.of(label, reader.curve())), reader.messages());
    }

    /** Without the folder. */
    public String fileName() {
        return fileName;
    }

    /** At least one. */
    public List<MeasuredCurve> curves() {
        return curves;
    }

    /** What was found out about the file, a line each. */
    public List<String> messages() {
        return messages;
    }
}
