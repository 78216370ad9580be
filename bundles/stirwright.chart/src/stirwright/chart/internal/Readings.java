package stirwright.chart.internal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import stirwright.chart.Curve;
import stirwright.chart.Reading;

/** What curves say at one x. */
public final class Readings {
    private Readings() { }

    /** The values of the curves that have one there, the highest first. */
    public static Reading at(double at, List<Curve> curves, Span x, Span y) {
        List<Reading.At> values = new ArrayList<>();
        for (Curve curve : curves) {
            int i = segment(curve, at, x, y);
            if (i >= 0) {
                boolean inside = curve.inside()[i] && curve.inside()[Math.min(i + 1, curve.x().length - 1)];
                values.add(new Reading.At(curve.id(), curve.label(), value(curve, i, at, x, y), inside));
            }
        }
        values.sort(Comparator.comparingDouble(Reading.At::value).reversed());
        return new Reading(at, values);
    }

    /** The first point of the stretch that holds {@code at}; -1 where the curve has none. */
    private static int segment(Curve curve, double at, Span x, Span y) {
        int last = curve.x().length - 1;
        for (int i = 0; i < last; i++) {
            if (curve.x()[i] <= at && at <= curve.x()[i + 1] && stands(curve, i, x, y) && stands(curve, i + 1, x, y)) {
                return i;
            }
        }
        for (int i = 0; i <= last; i++) {
            if (curve.x()[i] == at && stands(curve, i, x, y)) {
                return i;
            }
        }
        return -1;
    }

    private static boolean stands(Curve curve, int i, Span x, Span y) {
        return Double.isFinite(x.along(curve.x()[i])) && Double.isFinite(y.along(curve.y()[i]));
    }

    private static double value(Curve curve, int i, double at, Span x, Span y) {
        if (curve.x()[i] == at || i + 1 == curve.x().length) {
            return curve.y()[i];
        }
        if (curve.x()[i + 1] == at) {
            return curve.y()[i + 1];
        }
        double from = x.along(curve.x()[i]);
        double part = (x.along(at) - from) / (x.along(curve.x()[i + 1]) - from);
        double low = y.along(curve.y()[i]);
        return y.value(low + part * (y.along(curve.y()[i + 1]) - low));
    }
}
