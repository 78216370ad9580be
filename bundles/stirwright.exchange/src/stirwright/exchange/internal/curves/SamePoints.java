package stirwright.exchange.internal.curves;

import java.util.Arrays;
import stirwright.rheology.FlowCurve;

/** A curve by its points alone: the same measurement may lie in two sheets, or in two files. */
public record SamePoints(FlowCurve curve) {

    @Override
    public boolean equals(Object other) {
        return other instanceof SamePoints same && Arrays.equals(curve.shearRates(), same.curve.shearRates())
                && Arrays.equals(curve.stresses(), same.curve.stresses());
    }

    @Override
    public int hashCode() {
        return 31 * Arrays.hashCode(curve.shearRates()) + Arrays.hashCode(curve.stresses());
    }
}
