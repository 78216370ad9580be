package stirwright.core;

import stirwright.correlation.Contribution;

/**
 * A contribution and the bundle that brought it.
 *
 * @param origin the bundle's name and version, as a message names it
 */
public record Arrival(Contribution contribution, String origin) {}
