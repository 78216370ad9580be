package stirwright.core.internal;

import java.util.function.Supplier;
import stirwright.core.CaseRefusedException;

/**
 * Runs what other bundles contributed. This is the one place in the core that catches whatever such
 * code throws, so that one bad contribution costs itself alone. Once it has failed it is not run
 * again. Not thread-safe.
 */
public final class ForeignCode {
    private String failure = "";

    /** What it threw; empty when it did not. */
    public String failure() {
        return failure;
    }

    /**
     * @param otherwise the answer when it fails or has failed before
     * @throws CaseRefusedException the core's own answer on the way passes through
     */
    public <T> T call(Supplier<T> code, T otherwise) {
        if (!failure.isEmpty()) {
            return otherwise;
        }
        try {
            return code.get();
        } catch (CaseRefusedException refused) {
            throw refused;
        } catch (RuntimeException | LinkageError broken) {
            // Broad on purpose: nobody here knows what code of another bundle may throw, see the class comment.
            failure = String.valueOf(broken);
            return otherwise;
        }
    }
}
