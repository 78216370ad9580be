package stirwright.exchange.internal.curves;

import stirwright.exchange.CurvePoint;
import stirwright.exchange.DroppedPoint;
import stirwright.exchange.PointPlace;

/**
 * A point with what stands in its row.
 *
 * @param stressText the viscosity where no stress is measured
 * @param canBePutBack whether shear rate and stress are numbers above 0
 */
record ReadPoint(WorkRow row, CurvePoint point, String rateText, String stressText, boolean canBePutBack) {

    boolean taken() {
        return point.taken();
    }

    /** NaN when it cannot be placed among others. */
    double rate() {
        return point.shearRate() > 0 ? point.shearRate() : Double.NaN;
    }

    DroppedPoint dropped(int block) {
        PointPlace place = point.place();
        return new DroppedPoint(block, place, rateText, stressText, point.dropped(), canBePutBack);
    }
}
