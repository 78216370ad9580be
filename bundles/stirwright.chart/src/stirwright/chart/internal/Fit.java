package stirwright.chart.internal;

import java.util.List;
import java.util.function.Function;
import stirwright.chart.Axis;
import stirwright.chart.Curve;

/** The span of an axis before anybody zooms. */
public final class Fit {
    private Fit() { }

    /** What the axis asks for; where its ends span nothing, what the curves need, else one decade or one unit. */
    public static Span of(Axis axis, List<Curve> curves, Function<Curve, double[]> values) {
        Span ready = new Span(axis.log(), 1, axis.log() ? 10 : 2);
        Span asked = ready.between(axis.least(), axis.most());
        if (axis.least() < axis.most() && asked != ready) {
            return asked;
        }
        double least = Double.POSITIVE_INFINITY;
        double most = Double.NEGATIVE_INFINITY;
        for (Curve curve : curves) {
            for (double value : values.apply(curve)) {
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

    /** Whether any curve has a point that can be drawn. */
    public static boolean anything(List<Curve> curves, Span x, Span y) {
        for (Curve curve : curves) {
            for (int i = 0; i < curve.x().length; i++) {
                if (Double.isFinite(x.along(curve.x()[i])) && Double.isFinite(y.along(curve.y()[i]))) {
                    return true;
                }
            }
        }
        return false;
    }
}
