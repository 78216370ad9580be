package stirwright.console.internal;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Supplier;
import stirwright.conformance.BundleReport;
import stirwright.conformance.JarRefusedException;
import stirwright.conformance.Proof;
import stirwright.core.Catalogue;
import stirwright.trust.DropIns;

/**
 * What every command works with.
 *
 * @param catalogue what is installed at this moment
 * @param jarCheck the conformance suite over a jar
 * @param installedCheck the conformance suite over everything that is installed
 * @param proofs what the installed correlations were checked against
 * @param dropIns the bundles in the folder families, and the user's word on them
 * @param out results alone
 * @param err every message
 * @param version of the product
 */
record Desk(Supplier<Catalogue> catalogue, JarChecker jarCheck, Supplier<List<BundleReport>> installedCheck,
        Supplier<List<Proof>> proofs, DropIns dropIns, PrintWriter out, PrintWriter err, String version) {

    /** Runs the conformance suite over a jar. */
    @FunctionalInterface
    interface JarChecker {
        BundleReport check(Path jar) throws JarRefusedException, IOException;
    }

    /** Says what is wrong with installed contributions; silent when nothing is. */
    void reportProblems(Catalogue installed) {
        installed.problems().forEach(p -> err.println("installed families: " + p));
    }
}
