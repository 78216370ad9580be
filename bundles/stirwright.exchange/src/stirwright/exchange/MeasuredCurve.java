package stirwright.exchange;

import java.util.List;
import stirwright.rheology.FlowCurve;

/**
 * A flow curve, what its file calls it and where it comes from.
 *
 * @param label unique within its source
 */
public record MeasuredCurve(String label, FlowCurve points, Measurement measurement) {

    /** A curve that comes from no file. */
    public static MeasuredCurve of(String label, FlowCurve points) {
        return new MeasuredCurve(label, points,
                new Measurement("", "", "", "", Ramp.NONE, 1, Double.NaN, List.of(), List.of()));
    }
}
