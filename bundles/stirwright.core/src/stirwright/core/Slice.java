package stirwright.core;

import stirwright.correlation.BoundCorrelation;
import stirwright.correlation.Variable;

/**
 * A bound correlation over one variable, everything else held: what a chart draws. Not thread-safe.
 */
public final class Slice {
    private final BoundCorrelation correlation;
    private final Point point;
    private final Variable over;

    /**
     * @param point the held variables; this slice owns it from now on
     * @param over the variable that is swept
     */
    public Slice(BoundCorrelation correlation, Point point, Variable over) {
        this.correlation = correlation;
        this.point = point;
        this.over = over;
    }

    /**
     * Evaluates a block without allocating.
     *
     * @param values of the swept variable, in its SI unit
     * @param into receives a value each, in the unit of the correlation's quantity
     * @throws IllegalArgumentException when the lengths differ
     */
    public void evaluate(double[] values, double[] into) {
        if (values.length != into.length) {
            throw new IllegalArgumentException(values.length + " values into room for " + into.length);
        }
        for (int i = 0; i < values.length; i++) {
            into[i] = correlation.at(point.set(over, values[i]));
        }
    }
}
