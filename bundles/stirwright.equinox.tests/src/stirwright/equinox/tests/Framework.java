package stirwright.equinox.tests;

import java.io.ByteArrayInputStream;
import java.time.Duration;
import java.util.Arrays;
import java.util.Optional;
import java.util.function.BooleanSupplier;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.BundleException;
import org.osgi.framework.FrameworkUtil;
import org.osgi.framework.ServiceReference;
import stirwright.core.Catalogue;
import stirwright.core.Library;

/** The running framework, as tests need it. */
final class Framework {
    private static final Duration PATIENCE = Duration.ofSeconds(5);

    private Framework() {}

    static BundleContext context() {
        return FrameworkUtil.getBundle(Framework.class).getBundleContext();
    }

    static Optional<Bundle> bundle(String symbolicName) {
        return Arrays.stream(context().getBundles()).filter(b -> symbolicName.equals(b.getSymbolicName())).findFirst();
    }

    static Bundle installed(String symbolicName) {
        return bundle(symbolicName).orElseThrow(() -> new AssertionError(symbolicName + " is not installed"));
    }

    /** What the workbench sees at this moment. */
    static Catalogue catalogue() {
        return library().catalogue();
    }

    static Library library() {
        ServiceReference<Library> reference = context().getServiceReference(Library.class);
        if (reference == null) {
            throw new AssertionError("no service " + Library.class.getName());
        }
        return context().getService(reference);
    }

    /** Installs and starts a bundle; the caller uninstalls it. */
    static Bundle install(String name, byte[] jar) throws BundleException {
        Bundle bundle = context().installBundle("test:" + name, new ByteArrayInputStream(jar));
        bundle.start();
        return bundle;
    }

    /** Whether something becomes true before patience ends. */
    static boolean becomes(BooleanSupplier condition) throws InterruptedException {
        long end = System.nanoTime() + PATIENCE.toNanos();
        while (!condition.getAsBoolean()) {
            if (System.nanoTime() > end) {
                return false;
            }
            Thread.sleep(10);
        }
        return true;
    }
}
