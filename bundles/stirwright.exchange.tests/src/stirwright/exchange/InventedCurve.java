package stirwright.exchange;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import stirwright.rheology.FlowCurve;

/**
 * An invented flow curve: 12 Pa + 3.5 Pa s^0.45 at round shear rates, stresses to four digits; no product and no
 * instrument gave it. As decimals, so that it can be written in any unit without rounding.
 */
final class InventedCurve {
    private static final String[] RATES = {"0.1", "0.2", "0.5", "1", "2", "5", "10", "20", "50", "100", "200", "500"};

    private InventedCurve() {}

    /** @param stress Pa */
    record Point(BigDecimal rate, BigDecimal stress) {

        /** Pa s, to six digits. */
        BigDecimal viscosity() {
            return stress.divide(rate, new MathContext(6));
        }

        Point times(String factor) {
            return new Point(rate, stress.multiply(new BigDecimal(factor)).round(new MathContext(4)));
        }
    }

    /** By rising shear rate. */
    static List<Point> up() {
        List<Point> points = new ArrayList<>();
        for (String rate : RATES) {
            double stress = 12 + 3.5 * Math.pow(Double.parseDouble(rate), 0.45);
            points.add(new Point(new BigDecimal(rate), new BigDecimal(stress).round(new MathContext(4))));
        }
        return points;
    }

    /** Falling, at nine tenths of the stress. */
    static List<Point> down() {
        List<Point> points = new ArrayList<>(up().stream().map(p -> p.times("0.9")).toList());
        Collections.reverse(points);
        return points;
    }

    static FlowCurve curve(List<Point> points) {
        return FlowCurve.of(points.stream().mapToDouble(p -> p.rate().doubleValue()).toArray(),
                points.stream().mapToDouble(p -> p.stress().doubleValue()).toArray());
    }
}
