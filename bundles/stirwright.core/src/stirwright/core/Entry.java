package stirwright.core;

import stirwright.correlation.Correlation;

/** A correlation and the bundle that brought it. */
public record Entry(Correlation correlation, String origin) {}
