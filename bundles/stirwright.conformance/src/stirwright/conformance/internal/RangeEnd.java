package stirwright.conformance.internal;

import java.util.ArrayList;
import java.util.List;
import stirwright.correlation.Bound;
import stirwright.correlation.Correlation;

/**
 * A stated end of a range that a case can pass.
 *
 * @param outward +1 at the upper end, -1 at the lower
 */
record RangeEnd(Bound.Range range, double value, int outward) {
    private static final double INWARD_SHARE = 0.4;
    private static final double INWARD_FRACTION = 0.1;

    /** Open ends, and lower ends at zero or below, cannot be passed. */
    static List<RangeEnd> of(Correlation correlation) {
        List<RangeEnd> ends = new ArrayList<>();
        for (Bound bound : correlation.validity()) {
            if (bound instanceof Bound.Range range) {
                if (range.least() > 0) {
                    ends.add(new RangeEnd(range, range.least(), -1));
                }
                if (range.most() > 0 && range.most() < Double.POSITIVE_INFINITY) {
                    ends.add(new RangeEnd(range, range.most(), 1));
                }
            }
        }
        return ends;
    }

    /** The value of the measure beyond the end by this factor. */
    double beyond(double factor) {
        return outward > 0 ? value * factor : value / factor;
    }

    /** A value within the range, not far from the end. */
    double inward() {
        double width = range.most() - range.least();
        double step = width < Double.POSITIVE_INFINITY ? INWARD_SHARE * width : INWARD_FRACTION * value;
        return value - outward * step;
    }
}
