package stirwright.exchange.internal.curves;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import stirwright.exchange.BlockUse;
import stirwright.exchange.CurveBlock;
import stirwright.exchange.CurveImport;
import stirwright.exchange.CurvePoint;
import stirwright.exchange.CurveSource;
import stirwright.exchange.Finding;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.ImportCounts;
import stirwright.exchange.ImportMessage;
import stirwright.exchange.MeasuredCurve;
import stirwright.exchange.Measurement;
import stirwright.exchange.PointPlace;
import stirwright.exchange.Ramp;
import stirwright.exchange.internal.table.TextFile;
import stirwright.rheology.FlowCurve;

/** From a source to its curves: for now a plain table of shear rate and stress, in UTF-8. */
public final class Importer {

    private Importer() {}

    /** See {@link CurveImport#of}. */
    public static CurveImport read(CurveSource source, ImportChoice choice) {
        String text = new String(source.bytes(), StandardCharsets.UTF_8);
        CurveReader read = CurveReader.read(new TextFile(source.name(), Path.of(source.shown()), text));
        FlowCurve curve = read.curve();
        List<CurvePoint> points = new ArrayList<>();
        for (int i = 0; i < curve.size(); i++) {
            points.add(new CurvePoint(new PointPlace("", i + 1, 1), curve.shearRate(i), curve.stress(i), Double.NaN,
                    Double.NaN, Double.NaN, Double.NaN, "", ""));
        }
        CurveBlock block = new CurveBlock(1, "", "", 1, BlockUse.UNORDERED, BlockUse.UNORDERED, true, "the only one", 1,
                Double.NaN, List.of(), points, List.of());
        return new CurveImport(source, choice,
                List.of(new Finding(Finding.Topic.FORM, "text", "a plain table", false)), List.of(), List.of(block),
                List.of(), new ImportCounts(curve.size(), 0, curve.size(), 0, 0, 0, 0, 0),
                read.messages().stream().map(m -> new ImportMessage(ImportMessage.Weight.NOTE, m)).toList(),
                List.of(new MeasuredCurve(source.stem(), curve, new Measurement(source.name(), source.sha256(), "1",
                        Ramp.NONE, 1, Double.NaN, List.of(), List.of()))));
    }
}
