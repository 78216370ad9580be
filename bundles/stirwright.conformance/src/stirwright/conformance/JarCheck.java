package stirwright.conformance;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.BundleException;
import stirwright.conformance.internal.Arrivals;
import stirwright.conformance.internal.BundleErrors;
import stirwright.conformance.internal.BundleFile;
import stirwright.core.Arrival;

/**
 * Runs the suite over a jar: installs it into the running framework, as the drop-in folder would,
 * looks at what it publishes, and removes it again.
 */
public final class JarCheck {
    private static final Duration PATIENCE = Duration.ofSeconds(5);

    /** Tells a bundle under check from any other, also after an interrupted run. */
    private static final String LOCATION = "stirwright-check:";

    private JarCheck() {}

    /**
     * @param context of an active bundle
     * @throws JarRefusedException when the file is no bundle, is installed already, lacks a
     *     requirement, does not start or publishes no contribution
     * @throws IOException when the file cannot be read
     */
    public static BundleReport check(BundleContext context, Path jar) throws JarRefusedException, IOException {
        byte[] content = Files.readAllBytes(jar);
        Bundle bundle = install(context, jar, content);
        try {
            start(bundle, jar);
            if (!Arrivals.await(context, bundle, PATIENCE)) {
                throw new JarRefusedException(BundleErrors.nothingPublished(bundle, PATIENCE));
            }
            return BundleReport.of(InstalledBundles.subject(context, bundle));
        } finally {
            remove(bundle);
        }
    }

    private static Bundle install(BundleContext context, Path jar, byte[] content) throws JarRefusedException {
        String location = LOCATION + jar.toAbsolutePath().normalize();
        try {
            BundleFile file = BundleFile.of(jar.toString(), content);
            Bundle leftover = context.getBundle(location);
            if (leftover != null) {
                leftover.uninstall();
            }
            for (Bundle installed : context.getBundles()) {
                if (file.symbolicName().equals(installed.getSymbolicName())) {
                    throw new JarRefusedException(jar + ": a bundle of the same name is installed already, "
                            + Arrival.origin(installed) + " from " + installed.getLocation()
                            + "; take it out of the drop-in folder, or check the jar under another name");
                }
            }
            return context.installBundle(location, new ByteArrayInputStream(content));
        } catch (BundleException refused) {
            throw new JarRefusedException(jar + " cannot be installed: " + refused.getMessage());
        }
    }

    private static void start(Bundle bundle, Path jar) throws JarRefusedException {
        try {
            bundle.start(Bundle.START_TRANSIENT);
        } catch (BundleException failure) {
            throw new JarRefusedException(jar + ": " + BundleErrors.words(failure));
        }
    }

    private static void remove(Bundle bundle) throws JarRefusedException {
        try {
            bundle.uninstall();
        } catch (BundleException failure) {
            throw new JarRefusedException(Arrival.origin(bundle) + " cannot be removed again: "
                    + failure.getMessage());
        }
    }
}
