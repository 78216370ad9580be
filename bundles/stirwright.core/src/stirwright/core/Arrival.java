package stirwright.core;

import java.util.List;
import java.util.Optional;
import org.osgi.framework.Bundle;
import stirwright.core.internal.ForeignCode;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;

/**
 * What a contribution brought when it arrived.
 *
 * @param origin the bundle's name and version, as a message names it
 * @param failure what its code threw when it was asked; then it brought nothing
 */
public record Arrival(String origin, List<Family> families, List<Correlation> correlations, Optional<String> failure) {

    /** Asks a contribution once. */
    public static Arrival of(Contribution contribution, String origin) {
        ForeignCode foreign = new ForeignCode();
        List<Family> families = foreign.call(() -> List.copyOf(contribution.families()), List.of());
        List<Correlation> correlations = foreign.call(() -> List.copyOf(contribution.correlations()), List.of());
        return foreign.failure().isEmpty()
                ? new Arrival(origin, families, correlations, Optional.empty())
                : new Arrival(origin, List.of(), List.of(), Optional.of(foreign.failure()));
    }

    /** How messages name a bundle; null is a bundle that has left. */
    public static String origin(Bundle bundle) {
        return bundle == null ? "a bundle that has left" : bundle.getSymbolicName() + " " + bundle.getVersion();
    }
}
