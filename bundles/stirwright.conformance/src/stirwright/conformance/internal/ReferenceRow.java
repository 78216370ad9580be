package stirwright.conformance.internal;

import java.util.Optional;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;

/**
 * A published number and the case for which it was published.
 *
 * @param place file and line
 * @param source where the number comes from
 * @param tolerance relative, within which it must be met
 * @param markedOutside whether it says itself that it lies outside the stated bounds
 */
record ReferenceRow(
        String place, Correlation correlation, Family family, RowKind kind, double expected, String source,
        double tolerance, Situation situation, boolean markedOutside) {

    /** Why a correlation was not made for a case, in words; empty when no stated bound stands against it. */
    static Optional<String> obstacle(Correlation correlation, Situation situation) {
        if (!correlation.appliesTo(situation)) {
            return Optional.of("it applies when " + correlation.appliesWhen());
        }
        return correlation.validity().stream().filter(bound -> bound.verdict(situation, situation).fails()).findFirst()
                .map(bound -> "the bound is " + bound.words() + ", the row has " + bound.found(situation, situation));
    }

    Optional<String> obstacle() {
        return obstacle(correlation, situation);
    }

    boolean within() {
        return obstacle().isEmpty();
    }

    /** Whether it would be missed if the correlation were another. */
    boolean missedBy(Correlation other) {
        return !(Math.abs(deviation(other)) <= tolerance);
    }

    /** Relative; NaN when there is no value. */
    double deviation(Correlation computed) {
        return Outcome.of(computed, situation).value() / expected - 1;
    }
}
