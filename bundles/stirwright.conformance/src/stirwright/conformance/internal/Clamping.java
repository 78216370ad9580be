package stirwright.conformance.internal;

import java.util.Comparator;
import java.util.List;
import stirwright.correlation.Correlation;
import stirwright.correlation.Figures;

/** Whether a value goes on beyond a stated range, or is held at its end as if the case were there. */
public final class Clamping {

    /** Cases next to the end, on the inside: one of them may be at the end itself. */
    private static final int NEXT = 2;

    private static final double EQUAL = 1e-12;

    private Clamping() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        for (Correlation correlation : workpiece.correlations()) {
            List<Situation> bases = workpiece.trials(correlation).bases();
            RangeEnd.of(correlation).stream()
                    .filter(end -> bases.stream().flatMap(base -> Lines.of(end.range(), base).stream())
                            .anyMatch(line -> held(correlation, end, line)))
                    .forEach(end -> findings.add(correlation.id(), "beyond '" + end.range().words()
                            + "' the value stays what it is at " + Figures.show(end.value())
                            + "; extrapolate or give NaN, the verdict flags the case"));
        }
    }

    private static boolean held(Correlation correlation, RangeEnd end, List<Situation> line) {
        List<Outcome> beyond = line.stream().filter(end::passedBy).map(s -> Outcome.of(correlation, s)).toList();
        if (beyond.size() < NEXT || !beyond.get(0).finite()) {
            return false;
        }
        Outcome level = beyond.get(0);
        return beyond.stream().allMatch(outcome -> outcome.differenceTo(level) <= EQUAL)
                && line.stream().filter(situation -> !end.fails(situation))
                        .sorted(Comparator.comparingDouble(end::distance)).limit(NEXT)
                        .anyMatch(situation -> Outcome.of(correlation, situation).differenceTo(level) > EQUAL);
    }
}
