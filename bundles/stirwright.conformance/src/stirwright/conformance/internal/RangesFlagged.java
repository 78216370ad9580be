package stirwright.conformance.internal;

import java.util.List;
import stirwright.correlation.Correlation;

/** Whether a stated range can tell that a case is beyond it. */
public final class RangesFlagged {

    private RangesFlagged() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        for (Correlation correlation : workpiece.correlations()) {
            List<Situation> bases = workpiece.trials(correlation).bases();
            RangeEnd.of(correlation).stream()
                    .filter(end -> !bases.stream().allMatch(base -> flags(end, base)))
                    .forEach(end -> findings.add(correlation.id(), "nothing that can be changed takes a case beyond the "
                            + (end.upper() ? "upper" : "lower") + " end of its bound '" + end.range().words()
                            + "'; the measure must follow the case"));
        }
    }

    private static boolean flags(RangeEnd end, Situation base) {
        return Lines.of(end.range(), base).stream().anyMatch(line -> line.stream().anyMatch(end::passedBy));
    }
}
