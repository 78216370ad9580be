package stirwright.core;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import stirwright.correlation.Quantity;

/**
 * What the user settled by hand instead of leaving it to the recommendation.
 *
 * @param correlations the id to use for a quantity
 * @param givens a value to use for a quantity instead of any correlation
 * @param effectsLeftOut the ids of the effects for which no factor is applied
 * @param constants by the id of a correlation, other values for constants of it by their names; what comes of it is a
 *     candidate beside the correlation, called {@link #changed}
 */
public record Choices(
        Map<Quantity, String> correlations, Map<Quantity, Double> givens, Set<String> effectsLeftOut,
        Map<String, Map<String, Double>> constants) {

    /** The name of the input that leaves effects out. */
    public static final String EFFECTS_LEFT_OUT = "effects_left_out";

    /** The name of the input that changes constants. */
    public static final String CONSTANTS = "constants";

    public static final Choices NONE = new Choices(Map.of(), Map.of());

    private static final String CHANGED = "-changed";

    public Choices(Map<Quantity, String> correlations, Map<Quantity, Double> givens) {
        this(correlations, givens, Set.of(), Map.of());
    }

    /** @throws IllegalArgumentException when a quantity is both given and left to a correlation */
    public Choices {
        correlations = Map.copyOf(correlations);
        givens = Map.copyOf(givens);
        // In the order in which they were given, since sentences name them.
        effectsLeftOut = Collections.unmodifiableSet(new LinkedHashSet<>(effectsLeftOut));
        Map<String, Map<String, Double>> copy = new LinkedHashMap<>();
        constants.forEach((id, values) -> copy.put(id, Collections.unmodifiableMap(new LinkedHashMap<>(values))));
        constants = Collections.unmodifiableMap(copy);
        for (Quantity quantity : givens.keySet()) {
            if (correlations.containsKey(quantity)) {
                throw new IllegalArgumentException(quantity.title() + ": given as " + givens.get(quantity)
                        + " and by " + correlations.get(quantity) + "; choose one");
            }
        }
    }

    public Optional<String> correlation(Quantity quantity) {
        return Optional.ofNullable(correlations.get(quantity));
    }

    public OptionalDouble given(Quantity quantity) {
        Double value = givens.get(quantity);
        return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
    }

    /** What a correlation is called once constants of it were changed. */
    public static String changed(String correlationId) {
        return correlationId + CHANGED;
    }

    /** The id behind one that is called as {@link #changed} calls it; empty for any other. */
    public static Optional<String> published(String id) {
        return id.endsWith(CHANGED) ? Optional.of(id.substring(0, id.length() - CHANGED.length())) : Optional.empty();
    }

    /** The name of the input that chooses a correlation for a quantity. */
    public static String field(Quantity quantity) {
        if (quantity.equals(Quantity.POWER_NUMBER)) {
            return "correlation";
        }
        String name = quantity.equals(Quantity.SHEAR_RATE_CONSTANT) ? "shear_rate" : givenField(quantity);
        return name + "_correlation";
    }

    /** The name of the input that gives a value for a quantity. */
    public static String givenField(Quantity quantity) {
        return quantity.id().replace('-', '_');
    }
}
