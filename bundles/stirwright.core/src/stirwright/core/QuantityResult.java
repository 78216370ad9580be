package stirwright.core;

import java.util.List;
import java.util.Optional;
import stirwright.correlation.Correlation;
import stirwright.correlation.Quantity;
import stirwright.correlation.Verdict;

/**
 * One correlation for one quantity of a case, the other quantities at their pick.
 *
 * @param id of the correlation, or "given"
 * @param correlation empty for a given value
 * @param value in the quantity's unit; NaN where it means nothing
 */
public record QuantityResult(
        Quantity quantity, String id, Optional<Correlation> correlation, double value, Role role,
        Verdict verdict, List<String> failedBounds, String why) {}
