package stirwright.chart;

import java.util.List;
import java.util.Optional;

/**
 * What a chart shows.
 *
 * @param x the horizontal axis
 * @param y the vertical axis
 * @param curves in the order of drawing; the pick is always drawn last
 * @param bands vertical bands behind the curves
 * @param operatingPoint the operating point, if there is one
 * @param emptyMessage what is said when no curve has a point to show: one sentence that says what to do next
 */
public record Picture(Axis x, Axis y, List<Curve> curves, List<Band> bands, Optional<Mark> operatingPoint,
        String emptyMessage) {
    /** Keeps copies of the lists. */
    public Picture {
        curves = List.copyOf(curves);
        bands = List.copyOf(bands);
    }

    /** A picture with nothing in it but a message. */
    public static Picture empty(String message) {
        Axis none = new Axis("", "", false, 0, 1);
        return new Picture(none, none, List.of(), List.of(), Optional.empty(), message);
    }
}
