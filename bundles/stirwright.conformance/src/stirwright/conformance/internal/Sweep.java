package stirwright.conformance.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import stirwright.correlation.Correlation;
import stirwright.correlation.Variable;

/** Log sweeps of a correlation's variables over their stated ranges, one at a time, and all corners together. */
final class Sweep {
    private static final int POINTS = 41;

    private final Correlation correlation;
    private final Distance distance;

    Sweep(Correlation correlation, Distance distance) {
        this.correlation = correlation;
        this.distance = distance;
    }

    /** The swept situations that are within every bound. */
    List<Situation> over(Situation start) {
        List<Situation> swept = new ArrayList<>(List.of(start));
        List<Situation> corners = List.of(start);
        for (Map.Entry<Variable, Span> entry : Span.statedBy(correlation, start).entrySet()) {
            Variable variable = entry.getKey();
            Span span = entry.getValue();
            for (int i = 0; i < POINTS; i++) {
                swept.add(start.with(variable, span.at((double) i / (POINTS - 1))));
            }
            corners = corners.stream().flatMap(s -> span.ends().mapToObj(end -> s.with(variable, end))).toList();
        }
        swept.addAll(corners);
        swept.removeIf(situation -> !distance.within(situation));
        return swept;
    }
}
