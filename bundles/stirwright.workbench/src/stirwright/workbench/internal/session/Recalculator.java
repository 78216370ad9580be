package stirwright.workbench.internal.session;

import java.util.concurrent.CompletableFuture;
import java.util.concurrent.Executor;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.Consumer;

/**
 * Computes off the user interface's thread. Only the newest request counts: one that is overtaken while it waits or runs is
 * given up, so typing never queues work.
 */
final class Recalculator implements AutoCloseable {
    private final ExecutorService worker = Executors.newSingleThreadExecutor(
            task -> Thread.ofPlatform().daemon().name("stirwright-cases").unstarted(task));
    private final AtomicLong newest = new AtomicLong();
    private final Executor ui;
    private final Consumer<Outcome> receiver;
    /** The request whose outcome was delivered last, or given up by hand. */
    private volatile long settled;
    private volatile Throwable defect;

    /**
     * @param ui runs what touches widgets
     * @param receiver of each outcome that is still wanted, called by {@code ui}
     */
    Recalculator(Executor ui, Consumer<Outcome> receiver) {
        this.ui = ui;
        this.receiver = receiver;
    }

    void request(Request request) {
        long mine = newest.incrementAndGet();
        CompletableFuture.supplyAsync(() -> Calculation.of(request, () -> mine != newest.get()), worker)
                .whenCompleteAsync((outcome, failure) -> settle(mine, outcome, failure), ui);
    }

    private void settle(long mine, Outcome outcome, Throwable failure) {
        if (mine != newest.get()) {
            return;
        }
        settled = mine;
        defect = failure;
        if (failure == null) {
            receiver.accept(outcome);
        }
    }

    /** Whether an outcome is still to come. */
    boolean busy() {
        return settled != newest.get();
    }

    /** Gives up what is being worked on; the last outcome stays. */
    void stop() {
        settled = newest.incrementAndGet();
    }

    /** What ended the newest request instead of an outcome; null when nothing did. */
    Throwable defect() {
        return defect;
    }

    @Override
    public void close() {
        stop();
        worker.shutdownNow();
    }
}
