package stirwright.conformance.internal;

import stirwright.correlation.Correlation;

/**
 * A published number and the case for which it was published.
 *
 * @param place file and line
 */
record ReferenceRow(String place, Correlation correlation, RowKind kind, double expected, Situation situation) {}
