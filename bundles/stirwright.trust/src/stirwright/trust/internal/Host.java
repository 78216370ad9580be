package stirwright.trust.internal;

import java.io.ByteArrayInputStream;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.concurrent.atomic.AtomicBoolean;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.BundleEvent;
import org.osgi.framework.BundleException;
import org.osgi.framework.BundleListener;
import org.osgi.framework.Constants;
import org.osgi.framework.wiring.BundleRevision;
import org.osgi.framework.wiring.FrameworkWiring;

/** The framework that approved bundles are installed into. A bundle is never updated: it is removed and installed anew. */
final class Host {
    /** Tells our bundles from others. The hash is a part of the location, so one content never stands for another. */
    private static final String LOCATION = "stirwright-family:";

    private static final long PATIENCE_S = 10;

    /** Common practice, no source: a family that offers correlations starts within a fraction of a second. */
    private static final long START_S = 5;

    private final BundleContext context;
    private final AtomicBoolean changedElsewhere = new AtomicBoolean();
    private final BundleListener listener = this::notice;
    private final List<String> problems = new ArrayList<>();

    Host(BundleContext context) {
        this.context = context;
    }

    /** Removes what an earlier run left and takes note of what comes and goes from now on. */
    void open() {
        for (Bundle left : context.getBundles()) {
            if (left.getLocation().startsWith(LOCATION)) {
                uninstall(left);
            }
        }
        settle();
        context.addBundleListener(listener);
    }

    void close() {
        context.removeBundleListener(listener);
    }

    /** Whether a bundle that is not ours came, went or changed since the last call. */
    boolean changedElsewhere() {
        return changedElsewhere.getAndSet(false);
    }

    /** What could not be done, a sentence each. */
    List<String> problems() {
        return problems;
    }

    /** Installs the bytes that were hashed; whatever hinders it becomes the guest's trouble. */
    void install(Guest guest, JarContent content) {
        for (Bundle other : context.getBundles()) {
            if (content.name().equals(other.getSymbolicName()) && content.version().equals(other.getVersion().toString())) {
                guest.troubled("has the name and version " + content.name() + " " + content.version()
                        + " of a bundle that is installed already, from " + origin(other));
                return;
            }
        }
        try {
            Bundle bundle = context.installBundle(LOCATION + content.sha256() + ":" + guest.file().getFileName(),
                    new ByteArrayInputStream(content.bytes()));
            guest.became(bundle);
            if (!content.name().equals(bundle.getSymbolicName()) || !content.version().equals(bundle.getVersion().toString())) {
                remove(guest);
                guest.troubled("has more than one manifest: by one it is " + content.name() + " " + content.version()
                        + ", by another " + bundle.getSymbolicName() + " " + bundle.getVersion());
            } else if ((bundle.adapt(BundleRevision.class).getTypes() & BundleRevision.TYPE_FRAGMENT) != 0) {
                remove(guest);
                guest.troubled("is a fragment by one of its manifests; only bundles of their own are taken");
            }
        } catch (BundleException | RuntimeException refused) {
            // RuntimeException: what the framework makes of one jar must not keep the others out.
            guest.troubled("cannot be installed: " + refused.getMessage());
        }
    }

    /**
     * Transient, so that no framework starts it by itself at a later run. On a thread of its own: an activator that never
     * returns must not keep the user from declining it.
     *
     * @return whether it runs now
     */
    boolean start(Guest guest) {
        Bundle bundle = guest.bundle();
        FutureTask<Boolean> start = new FutureTask<>(() -> {
            bundle.start(Bundle.START_TRANSIENT | Bundle.START_ACTIVATION_POLICY);
            return true;
        });
        Thread starter = new Thread(start, "stirwright-start " + bundle.getSymbolicName());
        starter.setDaemon(true);
        guest.starts(start);
        starter.start();
        try {
            start.get(START_S, TimeUnit.SECONDS);
            guest.troubled("");
            return true;
        } catch (ExecutionException failure) {
            guest.troubled(Failures.words(failure.getCause()));
        } catch (TimeoutException hanging) {
            guest.troubled("has not come to the end of its start within " + START_S + " s and is waited for no longer;"
                    + " decline it, or take it out of the folder");
        } catch (InterruptedException ending) {
            Thread.currentThread().interrupt();
        }
        return false;
    }

    void stop(Guest guest) {
        try {
            guest.bundle().stop(Bundle.STOP_TRANSIENT);
        } catch (BundleException failure) {
            problems.add(guest.file() + ": did not stop in order: " + Failures.words(failure));
        }
    }

    void remove(Guest guest) {
        if (guest.bundle() != null) {
            uninstall(guest.bundle());
            guest.became(null);
        }
    }

    private void uninstall(Bundle bundle) {
        try {
            if (bundle.getState() != Bundle.UNINSTALLED) {
                bundle.uninstall();
            }
        } catch (BundleException failure) {
            problems.add(bundle.getSymbolicName() + " " + bundle.getVersion() + " could not be removed; end this program to"
                    + " be rid of it: " + failure.getMessage());
        }
    }

    /** Cuts the wires to bundles that were removed; those that used them stop, and start again if they can do without. */
    void settle() {
        FrameworkWiring wiring = context.getBundle(Constants.SYSTEM_BUNDLE_LOCATION).adapt(FrameworkWiring.class);
        Collection<Bundle> removed = wiring.getRemovalPendingBundles().stream()
                .filter(bundle -> bundle.getLocation().startsWith(LOCATION)).toList();
        if (removed.isEmpty()) {
            return;
        }
        CountDownLatch done = new CountDownLatch(1);
        wiring.refreshBundles(removed, event -> done.countDown());
        try {
            done.await(PATIENCE_S, TimeUnit.SECONDS);
        } catch (InterruptedException ending) {
            Thread.currentThread().interrupt();
        }
    }

    private void notice(BundleEvent event) {
        if (!event.getBundle().getLocation().startsWith(LOCATION)) {
            changedElsewhere.set(true);
        }
    }

    private static String origin(Bundle bundle) {
        String location = bundle.getLocation();
        return location.startsWith(LOCATION) ? location.substring(location.lastIndexOf(':') + 1) : location;
    }
}
