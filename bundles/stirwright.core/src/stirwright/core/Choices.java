package stirwright.core;

import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import stirwright.correlation.Quantity;

/**
 * What the user settled by hand instead of leaving it to the recommendation.
 *
 * @param correlations the id to use for a quantity
 * @param givens a value to use for a quantity instead of any correlation
 */
public record Choices(Map<Quantity, String> correlations, Map<Quantity, Double> givens) {
    public static final Choices NONE = new Choices(Map.of(), Map.of());

    /** @throws IllegalArgumentException when a quantity is both given and left to a correlation */
    public Choices {
        correlations = Map.copyOf(correlations);
        givens = Map.copyOf(givens);
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
