package stirwright.core.internal;

import stirwright.rheology.FluidModel;

/**
 * The shear rate at which stress times shear rate is the power per volume. It is exact for a fluid that is sheared
 * alike everywhere; of a vessel it is an average, lower than what the product sees near the impeller. Newtonian:
 * sqrt(P/(V mu)); power law: (P/(V K))^(1/(n + 1)).
 */
final class PowerBasedShear {

    /** On the logarithm of the shear rate. */
    private static final double TOLERANCE = 1e-13;
    private static final int STEPS = 100;
    /** Where exp() still gives a number above 0 and below infinity. */
    private static final double MOST_LN = 690;

    private PowerBasedShear() {}

    /**
     * @param powerPerVolume W/m3
     * @param near a shear rate in 1/s to start from
     * @return 1/s; NaN without a positive power
     */
    static double average(FluidModel model, double powerPerVolume, double near) {
        if (!(powerPerVolume > 0 && powerPerVolume < Double.POSITIVE_INFINITY)) {
            return Double.NaN;
        }
        double target = Math.log(powerPerVolume);
        double ln = Math.log(near);
        double low = Double.NEGATIVE_INFINITY;
        double high = Double.POSITIVE_INFINITY;
        for (int step = 0; step < STEPS && Math.abs(ln) < MOST_LN; step++) {
            double rate = Math.exp(ln);
            double gap = Math.log(model.stress(rate)) + ln - target;
            // It rises by the flow index plus 1, so by 1 at least: the root lies between here and the gap before or after.
            low = Math.max(low, gap > 0 ? ln - gap : ln);
            high = Math.min(high, gap > 0 ? ln : ln - gap);
            double next = ln - gap / (model.flowIndex(rate) + 1);
            if (!(next >= low && next <= high)) {
                next = (low + high) / 2;
            }
            if (Math.abs(next - ln) <= TOLERANCE * Math.max(1, Math.abs(ln))) {
                return Math.exp(next);
            }
            ln = next;
        }
        return Double.NaN;
    }
}
