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
 * @param points measured points, behind the curves
 * @param envelopes how far curves are known, behind the points
 * @param rules named places on the x axis
 * @param emptyMessage what is said when there is neither a curve nor a point to show: one sentence that says what to do next
 */
public record Picture(Axis x, Axis y, List<Curve> curves, List<Band> bands, Optional<Mark> operatingPoint,
        List<Points> points, List<Envelope> envelopes, List<Rule> rules, String emptyMessage) {
    /** Keeps copies of the lists. */
    public Picture {
        curves = List.copyOf(curves);
        bands = List.copyOf(bands);
        points = List.copyOf(points);
        envelopes = List.copyOf(envelopes);
        rules = List.copyOf(rules);
    }

    /** Curves alone. */
    public Picture(Axis x, Axis y, List<Curve> curves, List<Band> bands, Optional<Mark> operatingPoint, String emptyMessage) {
        this(x, y, curves, bands, operatingPoint, List.of(), List.of(), List.of(), emptyMessage);
    }

    /** A picture with nothing in it but a message. */
    public static Picture empty(String message) {
        Axis none = new Axis("", "", false, 0, 1);
        return new Picture(none, none, List.of(), List.of(), Optional.empty(), message);
    }
}
