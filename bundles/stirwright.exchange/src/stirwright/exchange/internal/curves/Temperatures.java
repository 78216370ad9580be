package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.List;
import stirwright.exchange.Measurement;

/** Parts points of one table that were measured at temperatures apart on purpose. */
final class Temperatures {
    /** With more of them the temperature has no steps. */
    private static final int MOST = 20;

    private Temperatures() {}

    /**
     * Points of each temperature, in their order. A temperature that creeps is one, and {@link BlockWarnings} tells its
     * drift; one that jumps is another, or the one before the last jump.
     */
    static List<List<ReadPoint>> apart(List<ReadPoint> points) {
        List<List<ReadPoint>> groups = new ArrayList<>(List.of(new ArrayList<>()));
        List<Double> now = new ArrayList<>(List.of(Double.NaN));
        int at = 0;
        for (ReadPoint point : points) {
            double celsius = point.point().temperature();
            if (!Double.isNaN(celsius) && !near(now.get(at), celsius)) {
                at = 0;
                while (at < now.size() && !near(now.get(at), celsius)) {
                    at++;
                }
                if (at == now.size()) {
                    groups.add(new ArrayList<>());
                    now.add(celsius);
                }
                if (now.size() > MOST) {
                    return List.of(points);
                }
            }
            if (!Double.isNaN(celsius)) {
                now.set(at, celsius);
            }
            groups.get(at).add(point);
        }
        return groups.size() == 1 ? List.of(points) : groups;
    }

    private static boolean near(double one, double other) {
        return Double.isNaN(one) || Measurement.sameTemperature(one, other);
    }
}
