package stirwright.conformance.internal;

import java.util.List;
import java.util.stream.Stream;
import stirwright.correlation.Bound;
import stirwright.correlation.Correlation;

/** A stated end of a range that a case can pass. */
record RangeEnd(Bound.Range range, boolean upper) {

    /** Open ends, and ends at zero or below, cannot be passed. */
    static List<RangeEnd> of(Correlation correlation) {
        return correlation.validity().stream().filter(Bound.Range.class::isInstance).map(Bound.Range.class::cast)
                .flatMap(range -> Stream.of(new RangeEnd(range, false), new RangeEnd(range, true)))
                .filter(end -> end.value() > 0 && end.value() < Double.POSITIVE_INFINITY).toList();
    }

    double value() {
        return upper ? range.most() : range.least();
    }

    /** Whether a case is beyond this end, and flagged. */
    boolean passedBy(Situation situation) {
        double found = measured(situation);
        return (upper ? found > range.most() : found < range.least()) && fails(situation);
    }

    boolean fails(Situation situation) {
        return range.verdict(situation, situation).fails();
    }

    /** How far a case is from the end, whichever side. */
    double distance(Situation situation) {
        return Math.abs(measured(situation) - value());
    }

    private double measured(Situation situation) {
        return range.subject().value(situation, situation);
    }
}
