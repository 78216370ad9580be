package stirwright.conformance.internal;

import stirwright.core.Arrival;

/** Whether the contributions answer at all. */
public final class Answers {

    private Answers() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        workpiece.arrivals().stream().flatMap((Arrival arrival) -> arrival.failure().stream())
                .forEach(failure -> findings.add(workpiece.origin(), "throws " + failure));
        if (workpiece.arrivals().stream().allMatch(arrival -> arrival.failure().isEmpty())
                && workpiece.ownFamilies().isEmpty() && workpiece.correlations().isEmpty()) {
            findings.add(workpiece.origin(), "contributes neither a family nor a correlation");
        }
    }
}
