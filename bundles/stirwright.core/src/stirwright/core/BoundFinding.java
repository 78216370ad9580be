package stirwright.core;

import stirwright.correlation.Verdict;

/**
 * How a case stands to one bound of a candidate.
 *
 * @param bound what the source allows, for instance "D/T 0.2 to 0.5"; a modifier's bound begins with its id
 * @param found what the case has, for instance "D/T 0.62"
 */
public record BoundFinding(String bound, String found, Verdict verdict) {}
