package stirwright.equinox.tests;

import java.io.IOException;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleActivator;
import org.osgi.framework.BundleContext;

/** Leaves a trace when its bundle runs. */
public final class Tattler implements BundleActivator {
    private static final String PROPERTY = "stirwright.equinox.tests.ran.";

    /** The version of the bundle that ran last under a name; null when none did since it was forgotten. */
    static String ran(String symbolicName) {
        return System.getProperty(PROPERTY + symbolicName);
    }

    static void forget(String symbolicName) {
        System.clearProperty(PROPERTY + symbolicName);
    }

    static TinyBundle bundle(String symbolicName, String version) throws IOException {
        return TinyBundle.named(symbolicName).header("Bundle-Version", version).holding(Tattler.class)
                .header("Bundle-Activator", Tattler.class.getName());
    }

    @Override
    public void start(BundleContext context) {
        Bundle bundle = context.getBundle();
        System.setProperty(PROPERTY + bundle.getSymbolicName(), bundle.getVersion().toString());
    }

    @Override
    public void stop(BundleContext context) {
        // The trace stays.
    }
}
