package stirwright.conformance.internal;

import java.util.OptionalDouble;
import stirwright.correlation.Correlation;
import stirwright.correlation.Figures;
import stirwright.correlation.Measure;

/** Whether a value goes on beyond a stated range, or is held at its end as if the case were there. */
public final class Clamping {
    private static final double BEYOND = 10;
    private static final double EQUAL = 1e-12;

    private Clamping() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        for (Correlation correlation : workpiece.offer().correlations()) {
            for (Situation base : workpiece.trials(correlation).bases().stream().limit(1).toList()) {
                RangeEnd.of(correlation).stream().filter(end -> held(correlation, end, base)).forEach(end ->
                        findings.add(correlation.id(), "beyond '" + end.range().words() + "' the value stays what it is at "
                                + Figures.show(end.value()) + "; extrapolate or give NaN, the verdict flags the case"));
            }
        }
    }

    private static boolean held(Correlation correlation, RangeEnd end, Situation base) {
        Measure measure = end.range().subject();
        return Coordinate.of(measure, base).stream().anyMatch(coordinate -> {
            OptionalDouble at = coordinate.reach(measure, end.value());
            OptionalDouble inward = coordinate.reach(measure, end.inward());
            OptionalDouble beyond = coordinate.reach(measure, end.beyond(BEYOND));
            if (at.isEmpty() || inward.isEmpty() || beyond.isEmpty()) {
                return false;
            }
            Outcome there = Outcome.of(correlation, coordinate.moved().apply(at.getAsDouble()));
            Outcome within = Outcome.of(correlation, coordinate.moved().apply(inward.getAsDouble()));
            Outcome outside = Outcome.of(correlation, coordinate.moved().apply(beyond.getAsDouble()));
            return there.finite() && within.differenceTo(there) > EQUAL && outside.differenceTo(there) <= EQUAL;
        });
    }
}
