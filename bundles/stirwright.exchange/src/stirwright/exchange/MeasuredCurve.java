package stirwright.exchange;

import stirwright.rheology.FlowCurve;

/**
 * A flow curve and what its file calls it.
 *
 * @param label the file's name without its ending
 */
public record MeasuredCurve(String label, FlowCurve points) {}
