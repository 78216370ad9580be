package stirwright.conformance.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import java.util.function.DoubleUnaryOperator;
import stirwright.correlation.Measure;

/** One thing that can be moved to move a measure: a dimension or a variable. */
record Coordinate(double start, DoubleFunction<Situation> moved) {
    private static final int SECTIONS = 320;
    private static final double DECADES = 8;
    private static final int HALVINGS = 100;
    private static final double CLOSE = 1e-9;
    private static final double WHERE_ZERO = 0.01;

    /** All that a measure reads. */
    static List<Coordinate> of(Measure measure, Situation situation) {
        ReadLog log = new ReadLog(situation);
        measure.value(log, log);
        List<Coordinate> coordinates = new ArrayList<>();
        log.dimensions().forEach(p -> coordinates.add(new Coordinate(start(situation.get(p)), v -> situation.with(p, v))));
        log.variables().forEach(x -> coordinates.add(new Coordinate(start(situation.get(x)), v -> situation.with(x, v))));
        return coordinates;
    }

    private static double start(double value) {
        return value > 0 && Double.isFinite(value) ? value : WHERE_ZERO;
    }

    /** The value of the coordinate at which a measure has the wanted value; empty when there is none. */
    OptionalDouble reach(Measure measure, double wanted) {
        DoubleUnaryOperator gap = ln -> {
            Situation there = moved.apply(Math.exp(ln));
            return measure.value(there, there) - wanted;
        };
        double from = Math.log(start) - DECADES * Math.log(10);
        double step = 2 * DECADES * Math.log(10) / SECTIONS;
        double left = from;
        for (int i = 1; i <= SECTIONS; i++) {
            double right = from + i * step;
            if (gap.applyAsDouble(left) * gap.applyAsDouble(right) <= 0) {
                double root = halve(gap, left, right);
                if (Math.abs(gap.applyAsDouble(root)) <= CLOSE * Math.abs(wanted)) {
                    return OptionalDouble.of(Math.exp(root));
                }
            }
            left = right;
        }
        return OptionalDouble.empty();
    }

    private static double halve(DoubleUnaryOperator gap, double from, double to) {
        double left = from;
        double right = to;
        double atLeft = gap.applyAsDouble(left);
        for (int i = 0; i < HALVINGS; i++) {
            double middle = (left + right) / 2;
            double atMiddle = gap.applyAsDouble(middle);
            if (atLeft * atMiddle <= 0) {
                right = middle;
            } else {
                left = middle;
                atLeft = atMiddle;
            }
        }
        return (left + right) / 2;
    }
}
