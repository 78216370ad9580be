package stirwright.conformance.internal;

import stirwright.correlation.Correlation;
import stirwright.correlation.Geometry;
import stirwright.correlation.OperatingPoint;

/**
 * What a correlation answers.
 *
 * @param value NaN when it failed
 * @param failure what it threw; empty when it did not
 */
record Outcome(double value, String failure) {

    static Outcome of(Correlation correlation, Situation situation) {
        return of(correlation, situation, situation);
    }

    static Outcome of(Correlation correlation, Geometry geometry, OperatingPoint point) {
        try {
            return new Outcome(correlation.bind(geometry).at(point), "");
        } catch (RuntimeException | LinkageError failure) {
            // Code of a contributor: that it throws is what the check has to tell.
            return new Outcome(Double.NaN, failure.toString());
        }
    }

    boolean finite() {
        return Double.isFinite(value);
    }

    /** Relative difference; large when only one of the two is finite. */
    double differenceTo(Outcome other) {
        if (finite() != other.finite()) {
            return Double.MAX_VALUE;
        }
        double size = Math.max(Math.abs(value), Math.abs(other.value));
        return !finite() || size == 0 ? 0 : Math.abs(value - other.value) / size;
    }
}
