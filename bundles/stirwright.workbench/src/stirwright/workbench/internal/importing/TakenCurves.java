package stirwright.workbench.internal.importing;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import stirwright.exchange.CurveImport;
import stirwright.exchange.DroppedPoint;
import stirwright.exchange.Finding;
import stirwright.exchange.ImportMessage;
import stirwright.exchange.MeasuredCurve;
import stirwright.exchange.Measurement;
import stirwright.study.Curve;
import stirwright.study.Curves;
import stirwright.workbench.internal.Messages;

/** Turns the curves of an import into those of a study, with all that says where they come from. */
final class TakenCurves {
    /** A study tells so many dropped points one by one; what a file drops by the thousand is no list for people. */
    private static final int MOST_TOLD = 100;
    /** What of the findings matters for the numbers even where nothing was overruled. */
    private static final Set<Finding.Topic> FOR_NUMBERS = Set.of(Finding.Topic.DECIMAL_SIGN, Finding.Topic.COLUMN);

    private TakenCurves() {}

    static List<Curve> of(CurveImport found) {
        return found.curves().stream().map(c -> of(c, found)).toList();
    }

    private static Curve of(MeasuredCurve measured, CurveImport found) {
        Measurement from = measured.measurement();
        Curve curve = Curves.of(measured.label(), measured.points().shearRates(), measured.points().stresses());
        curve.setSource(from.source());
        curve.setSha256(from.sha256());
        curve.setBlock(from.block());
        curve.setRamp(from.ramp().word());
        curve.setReplicate(from.replicate());
        if (!Double.isNaN(from.temperature())) {
            curve.setTemperature(from.temperature());
        }
        curve.getDropped().addAll(dropped(from.dropped()));
        found.findings().stream().filter(f -> f.overruled() || FOR_NUMBERS.contains(f.topic())).map(Finding::words)
                .distinct().forEach(curve.getReadAs()::add);
        found.messages().stream().filter(m -> m.weight() == ImportMessage.Weight.WARNING).map(ImportMessage::words)
                .distinct().forEach(curve.getReadAs()::add);
        curve.getReadAs().addAll(from.warnings());
        return curve;
    }

    private static List<String> dropped(List<DroppedPoint> points) {
        List<String> words = new ArrayList<>();
        points.stream().limit(MOST_TOLD).map(p -> Messages.bind(ImportWords.Dropped_line, p.place().words(), p.reason())).forEach(words::add);
        if (points.size() > MOST_TOLD) {
            words.add(Messages.bind(ImportWords.Dropped_more, points.size() - MOST_TOLD));
        }
        return words;
    }
}
