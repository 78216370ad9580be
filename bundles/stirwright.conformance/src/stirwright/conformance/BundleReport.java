package stirwright.conformance;

import java.util.List;
import org.osgi.framework.BundleContext;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;

/**
 * What the suite found in a bundle.
 *
 * @param bundle symbolic name and version
 * @param families ids of the families that it describes
 * @param correlations ids of the correlations that it brings
 * @param rows how many reference rows were read and compared
 * @param recalledRows how many of them are numbers from memory, which prove nothing
 * @param proofs what holds each correlation up
 */
public record BundleReport(
        String bundle, List<String> families, List<String> correlations, int rows, int recalledRows,
        List<Proof> proofs, List<Finding> findings) {

    static BundleReport of(Subject subject) {
        return new BundleReport(subject.origin(), subject.families().stream().map(Family::id).toList(),
                subject.correlations().stream().map(Correlation::id).toList(), subject.rows(), subject.recalledRows(),
                subject.proofs(), ConformanceSuite.examine(subject));
    }

    /** One for each bundle that publishes a contribution at this moment. */
    public static List<BundleReport> ofInstalled(BundleContext context) {
        return InstalledBundles.bundles(context)
                .map(bundle -> of(InstalledBundles.subject(context, bundle))).toList();
    }

    public boolean passed() {
        return findings.isEmpty();
    }
}
