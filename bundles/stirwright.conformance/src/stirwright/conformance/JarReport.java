package stirwright.conformance;

import java.util.List;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;

/**
 * What was found in a jar.
 *
 * @param bundle symbolic name and version
 * @param families ids of the families that it describes
 * @param correlations ids of the correlations that it brings
 * @param rows how many reference rows were read and compared
 * @param recalledRows how many of them are numbers from memory, which prove nothing
 */
public record JarReport(
        String bundle, List<String> families, List<String> correlations, int rows, int recalledRows,
        List<Finding> findings) {

    static JarReport of(Subject subject) {
        return new JarReport(subject.origin(), subject.families().stream().map(Family::id).toList(),
                subject.correlations().stream().map(Correlation::id).toList(), subject.rows(), subject.recalledRows(),
                ConformanceSuite.examine(subject));
    }

    public boolean passed() {
        return findings.isEmpty();
    }
}
