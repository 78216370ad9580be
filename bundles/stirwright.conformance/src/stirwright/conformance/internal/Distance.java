package stirwright.conformance.internal;

import java.util.ArrayList;
import java.util.List;
import stirwright.correlation.Bound;
import stirwright.correlation.Correlation;
import stirwright.correlation.Verdict;

/** How far a situation is from what a correlation was made for; zero when it is within every stated bound. */
record Distance(Correlation correlation, List<Bound> bounds) {
    private static final double NOT_APPLICABLE = 50;
    private static final double UNKNOWN = 20;
    private static final double ANOTHER_CLASS = 1;
    private static final double LEAST = 0.01;

    static Distance to(Correlation correlation) {
        return new Distance(correlation, correlation.validity());
    }

    /** The same with one bound made narrower. */
    Distance narrowed(Bound narrower) {
        return new Distance(correlation, bounds.stream()
                .map(b -> b.subject().equals(narrower.subject()) ? narrower : b).toList());
    }

    double of(Situation situation) {
        double sum = correlation.appliesTo(situation) ? 0 : NOT_APPLICABLE;
        for (Bound bound : bounds) {
            sum += of(bound, situation);
        }
        return sum;
    }

    boolean within(Situation situation) {
        return of(situation) == 0;
    }

    List<Bound> failing(Situation situation) {
        List<Bound> failing = new ArrayList<>(bounds);
        failing.removeIf(bound -> of(bound, situation) == 0);
        return failing;
    }

    private static double of(Bound bound, Situation situation) {
        Verdict verdict = bound.verdict(situation, situation);
        if (!verdict.fails()) {
            return 0;
        }
        if (!(bound instanceof Bound.Range range)) {
            return ANOTHER_CLASS;
        }
        double value = range.subject().value(situation, situation);
        double end = value < range.least() ? range.least() : range.most();
        double distance = Math.abs(Math.log(value / end));
        return Double.isNaN(distance) ? UNKNOWN : Math.min(UNKNOWN, LEAST + distance);
    }
}
