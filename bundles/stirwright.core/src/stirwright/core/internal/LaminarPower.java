package stirwright.core.internal;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import stirwright.core.CaseSpec;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.correlation.FluidClass;
import stirwright.correlation.Quantity;

/**
 * Power number times Reynolds number of the case's impeller in laminar flow, for candidates that read
 * it. It is found when it is first asked for and does not depend on the state. Not thread-safe.
 */
final class LaminarPower {

    /** Where tables print it, and laminar for every impeller; the product is then the power number itself. */
    private static final double REYNOLDS = 1;

    private final List<Candidate> powers;
    private final Optional<String> chosen;
    private final FluidState state;
    private OptionalDouble constant = OptionalDouble.empty();

    /** @param powers the most recommendable first */
    LaminarPower(List<Candidate> powers, CaseSpec spec, double diameter) {
        this.powers = powers;
        this.chosen = spec.choices().correlation(Quantity.POWER_NUMBER);
        double density = spec.fluid().density();
        // A Newtonian liquid in the same vessel at 1 rev/s, as viscous as the Reynolds number asks.
        this.state = new FluidState(1, 1, 1, density * diameter * diameter / REYNOLDS, 1, density, diameter, 0,
                FluidClass.NEWTONIAN);
    }

    /**
     * Of the correlation that the case asks for if no bound of it fails in laminar flow, else of the
     * first that qualifies there; NaN when there is none.
     */
    double constant() {
        if (constant.isEmpty()) {
            double found = powers.stream().filter(p -> chosen.filter(p.id()::equals).isPresent())
                    .mapToDouble(this::of).filter(v -> v > 0).findFirst().orElse(Double.NaN);
            constant = OptionalDouble.of(found > 0 ? found : powers.stream().filter(p -> p.distrust().isEmpty())
                    .mapToDouble(this::of).filter(v -> v > 0).findFirst().orElse(Double.NaN));
        }
        return constant.getAsDouble();
    }

    /** NaN outside of its bounds, and for what is no correlation. */
    private double of(Candidate power) {
        // A guard of its own: code that fails here alone must not cost its candidate the case.
        return new ForeignCode().call(() -> {
            Point point = new Point().at(state);
            double value = power.parts().isEmpty() || power.worst(point, state, REYNOLDS).fails()
                    ? Double.NaN : REYNOLDS * power.product(point, state, REYNOLDS);
            return value < Double.POSITIVE_INFINITY ? value : Double.NaN;
        }, Double.NaN);
    }
}
