package stirwright.conformance.internal;

import stirwright.correlation.Correlation;
import stirwright.correlation.Figures;

/** Whether a stated range can tell that a case is beyond it. */
public final class RangesFlagged {
    private static final double BEYOND = 1.25;

    private RangesFlagged() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        for (Correlation correlation : workpiece.offer().correlations()) {
            for (Situation base : workpiece.trials(correlation).bases().stream().limit(1).toList()) {
                RangeEnd.of(correlation).stream().filter(end -> !flags(end, base)).forEach(end ->
                        findings.add(correlation.id(), "nothing that can be changed makes its bound '" + end.range().words()
                                + "' fail with " + Figures.show(end.beyond(BEYOND)) + "; the measure must follow the case"));
            }
        }
    }

    private static boolean flags(RangeEnd end, Situation base) {
        return Coordinate.of(end.range().subject(), base).stream().anyMatch(coordinate ->
                coordinate.reach(end.range().subject(), end.beyond(BEYOND)).stream().anyMatch(value -> {
                    Situation there = coordinate.moved().apply(value);
                    return end.range().verdict(there, there).fails();
                }));
    }
}
