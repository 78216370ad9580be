package stirwright.core;

import java.util.List;
import java.util.Optional;
import org.osgi.framework.Bundle;
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
        try {
            return new Arrival(origin, List.copyOf(contribution.families()),
                    List.copyOf(contribution.correlations()), Optional.empty());
        } catch (RuntimeException | LinkageError failure) {
            // Code of another bundle: whatever it throws must not take the other families down.
            return new Arrival(origin, List.of(), List.of(), Optional.of(String.valueOf(failure)));
        }
    }

    /** How messages name a bundle; null is a bundle that has left. */
    public static String origin(Bundle bundle) {
        return bundle == null ? "a bundle that has left" : bundle.getSymbolicName() + " " + bundle.getVersion();
    }
}
