package stirwright.core;

import stirwright.correlation.Verdict;

/**
 * One candidate of a case over one variable, everything else as at the pick: what a chart draws. All
 * modifiers and verdicts are those of the table, so chart and table agree. Not thread-safe.
 */
public interface Slice {

    /**
     * Evaluates a block without allocating.
     *
     * @param values of the swept variable, in its SI unit; a Reynolds number is that of Metzner and Otto
     * @param into receives a value each, in the unit of the quantity; NaN where there is none
     * @param verdicts receives the worst verdict over all bounds at each value
     * @throws IllegalArgumentException when the lengths differ
     */
    void evaluate(double[] values, double[] into, Verdict[] verdicts);
}
