package stirwright.trust.internal;

import java.lang.System.Logger.Level;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.TimeUnit;
import org.osgi.framework.BundleContext;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Deactivate;
import stirwright.trust.Approval;
import stirwright.trust.DropIn;
import stirwright.trust.DropIns;
import stirwright.trust.UserFolder;

/** Watches the folder from activation on; the first look is made before activation ends, so no run misses a family. */
@Component(immediate = true)
public final class Families implements DropIns {
    private static final long POLL_MS = 400;
    private static final long PATIENCE_MS = TimeUnit.SECONDS.toMillis(10);

    private final List<Runnable> listeners = new CopyOnWriteArrayList<>();
    private volatile Snapshot snapshot = Snapshot.EMPTY;
    private Path folder;
    private Decisions decisions;
    private Host host;
    private Doorkeeper doorkeeper;
    private Thread watcher;
    // Guarded by this.
    private boolean woken;
    private boolean ended;

    @Activate
    void activate(BundleContext context) {
        folder = Settings.families(context);
        decisions = new Decisions(UserFolder.path());
        host = new Host(context);
        doorkeeper = new Doorkeeper(new FolderWatch(folder), decisions, host);
        host.open();
        look(true);
        watcher = new Thread(this::watch, "stirwright-families");
        watcher.setDaemon(true);
        watcher.start();
    }

    @Deactivate
    void deactivate() throws InterruptedException {
        synchronized (this) {
            ended = true;
            notifyAll();
        }
        watcher.join(PATIENCE_MS);
        host.close();
        doorkeeper.close();
    }

    private void watch() {
        while (!pausedUntilTheEnd()) {
            look(false);
        }
    }

    private void look(boolean atOnce) {
        try {
            publish(doorkeeper.look(atOnce));
        } catch (RuntimeException defect) {
            // Whatever went wrong at this look, commands must run and the folder must be watched on: an unwatched one would
            // keep running what the user takes out.
            logger().log(Level.WARNING, "a look into " + folder + " failed", defect);
            publish(new Snapshot(snapshot.list(), List.of(folder + ": could not be looked through: " + defect
                    + "; take out what was added last"), snapshot.approved()));
        }
    }

    private synchronized boolean pausedUntilTheEnd() {
        try {
            if (!woken && !ended) {
                wait(POLL_MS);
            }
        } catch (InterruptedException ending) {
            ended = true;
        }
        woken = false;
        return ended;
    }

    private synchronized void wake() {
        woken = true;
        notifyAll();
    }

    private void publish(Snapshot now) {
        if (now.equals(snapshot)) {
            return;
        }
        snapshot = now;
        for (Runnable listener : listeners) {
            try {
                listener.run();
            } catch (RuntimeException defect) {
                // A listener's defect must not keep the others from being told.
                logger().log(Level.WARNING, "a listener failed", defect);
            }
        }
    }

    private static System.Logger logger() {
        return System.getLogger(Families.class.getName());
    }

    @Override
    public Path folder() {
        return folder;
    }

    @Override
    public List<DropIn> list() {
        return snapshot.list();
    }

    @Override
    public List<String> problems() {
        return snapshot.problems();
    }

    @Override
    public List<Approval> approved() {
        return snapshot.approved();
    }

    @Override
    public void approve(String sha256) {
        String hash = Sha256.checked(sha256);
        decisions.approve(hash, nameOf(hash));
        wake();
    }

    @Override
    public void approve(DropIn bundle) {
        decisions.approve(Sha256.checked(bundle.sha256()), bundle.bundle());
        wake();
    }

    @Override
    public void decline(String sha256) {
        String hash = Sha256.checked(sha256);
        decisions.decline(hash, nameOf(hash));
        wake();
    }

    @Override
    public boolean forget(String sha256) {
        boolean listed = decisions.forget(Sha256.checked(sha256));
        wake();
        return listed;
    }

    @Override
    public DropIn read(Path file) {
        return Guest.view(file, JarContent.read(file).withoutBytes(), decisions);
    }

    @Override
    public AutoCloseable listen(Runnable changed) {
        listeners.add(changed);
        return () -> listeners.remove(changed);
    }

    private String nameOf(String sha256) {
        return list().stream().filter(dropIn -> dropIn.sha256().equals(sha256)).map(DropIn::bundle).findFirst().orElse("");
    }
}
