package stirwright.chart.internal;

import java.util.List;
import stirwright.chart.Axis;
import stirwright.chart.Picture;

/** The span of an axis before anybody zooms. */
public final class Fit {
    private Fit() { }

    /** What the axis asks for; where its ends span nothing, what curves and points need, else one decade or one unit. */
    public static Span of(Axis axis, List<double[]> values) {
        Span ready = new Span(axis.log(), 1, axis.log() ? 10 : 2);
        Span asked = ready.between(axis.least(), axis.most());
        if (axis.least() < axis.most() && asked != ready) {
            return asked;
        }
        double least = Double.POSITIVE_INFINITY;
        double most = Double.NEGATIVE_INFINITY;
        for (double[] some : values) {
            for (double value : some) {
                if (Double.isFinite(ready.along(value))) {
                    least = Math.min(least, value);
                    most = Math.max(most, value);
                }
            }
        }
        if (least == most) {
            return axis.log() ? ready.between(least / 3, most * 3)
                    : ready.between(least - Math.max(1, Math.abs(least)) / 2, most + Math.max(1, Math.abs(most)) / 2);
        }
        return ready.between(least, most).zoomed(ready.value((ready.along(least) + ready.along(most)) / 2), 0.95);
    }

    /** Whether any curve has a point, or any point a place, that can be drawn. */
    public static boolean anything(Picture picture, Span x, Span y) {
        return picture.curves().stream().anyMatch(c -> anything(c.x(), c.y(), x, y))
                || picture.points().stream().anyMatch(p -> anything(p.x(), p.y(), x, y));
    }

    private static boolean anything(double[] px, double[] py, Span x, Span y) {
        for (int i = 0; i < px.length; i++) {
            if (Double.isFinite(x.along(px[i])) && Double.isFinite(y.along(py[i]))) {
                return true;
            }
        }
        return false;
    }
}
