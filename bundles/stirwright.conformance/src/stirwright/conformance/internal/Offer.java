package stirwright.conformance.internal;

import java.util.ArrayList;
import java.util.List;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;

/**
 * What the contributions of a bundle answered.
 *
 * @param origin symbolic name and version
 * @param failures what each contribution that did not answer threw
 */
public record Offer(String origin, List<Family> families, List<Correlation> correlations, List<String> failures) {

    public static Offer ask(String origin, List<Contribution> contributions) {
        List<Family> families = new ArrayList<>();
        List<Correlation> correlations = new ArrayList<>();
        List<String> failures = new ArrayList<>();
        for (Contribution contribution : contributions) {
            try {
                families.addAll(List.copyOf(contribution.families()));
                correlations.addAll(List.copyOf(contribution.correlations()));
            } catch (RuntimeException | LinkageError failure) {
                // Code of a contributor: whatever it throws is what the contributor needs to hear.
                failures.add(contribution.getClass().getName() + " throws " + failure);
            }
        }
        return new Offer(origin, List.copyOf(families), List.copyOf(correlations), List.copyOf(failures));
    }
}
