package stirwright.cards.internal;

import java.util.List;
import java.util.Set;
import stirwright.correlation.GeometryParameter;

/**
 * A curve to draw.
 *
 * @param base the case that it is drawn for
 * @param read the dimensions that the formula reads
 * @param points in ascending order; all finite
 * @param rings numbers that the correlation was checked against and that belong on this curve
 */
record PlotData(Sweep sweep, PlotCase base, Set<GeometryParameter> read, List<Point> points, List<Ring> rings) {

    /** @param inside whether no stated bound fails there */
    record Point(double x, double y, boolean inside) {}

    record Ring(double x, double y, boolean fromOutside) {}

    PlotData {
        points = List.copyOf(points);
        rings = List.copyOf(rings);
    }

    boolean anyInside() {
        return points.stream().anyMatch(Point::inside);
    }

    boolean allInside() {
        return points.stream().allMatch(Point::inside);
    }
}
