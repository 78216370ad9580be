package stirwright.correlation;

import java.util.List;
import org.osgi.annotation.versioning.ConsumerType;

/**
 * The one service that a bundle publishes to contribute correlations: annotate a class with
 * {@code @Component}, implement this, done.
 *
 * <p>A contribution may describe families, bring correlations for families that other bundles
 * describe, or both. It must be stateless: the workbench asks once, when the service arrives, and
 * forgets the answer when it leaves.
 */
@ConsumerType
public interface Contribution {

    /** The impeller families that this bundle describes. */
    default List<Family> families() {
        return List.of();
    }

    /** The correlations and modifiers that this bundle brings. */
    List<Correlation> correlations();
}
