package stirwright.workbench.internal.session;

import java.util.List;
import stirwright.chart.Axis;
import stirwright.chart.Curve;

/** The part of an axis that curves take: what lies within their ranges when there is such a part, else all of it. */
record Range(double least, double most) {

    /** Room above the highest curve, our choice. */
    private static final double HEADROOM = 1.1;

    /** More decades than these squeeze what matters, our choice. */
    private static final double MOST_DECADES = 5;

    Axis axis(String title, String unit, boolean logarithmic) {
        return new Axis(title, unit, logarithmic, least, most);
    }

    /** Whole decades around the curves. */
    static Range logarithmic(List<Curve> curves) {
        Range all = around(curves);
        double most = Math.pow(10, Math.ceil(Math.log10(all.most)));
        double least = Math.pow(10, Math.floor(Math.log10(all.least)));
        return new Range(Math.max(least, most / Math.pow(10, MOST_DECADES)), most > least ? most : 10 * least);
    }

    static Range fromZero(List<Curve> curves) {
        return new Range(0, HEADROOM * around(curves).most);
    }

    private static Range around(List<Curve> curves) {
        Range inside = of(curves, true);
        Range used = inside.least <= inside.most ? inside : of(curves, false);
        return used.least <= used.most ? used : new Range(1, 1);
    }

    private static Range of(List<Curve> curves, boolean insideOnly) {
        double least = Double.POSITIVE_INFINITY;
        double most = 0;
        for (Curve curve : curves) {
            for (int i = 0; i < curve.y().length; i++) {
                double y = curve.y()[i];
                if (y > 0 && y < Double.POSITIVE_INFINITY && (curve.inside()[i] || curve.pick() || !insideOnly)) {
                    least = Math.min(least, y);
                    most = Math.max(most, y);
                }
            }
        }
        return new Range(least, most);
    }
}
