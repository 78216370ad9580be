package stirwright.workbench.internal.session;

import java.util.concurrent.CancellationException;
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
    private volatile CompletableFuture<Void> work = CompletableFuture.completedFuture(null);

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
        work = CompletableFuture.supplyAsync(() -> Calculation.of(request, () -> mine != newest.get()), worker)
                .thenAcceptAsync(outcome -> {
                    if (mine == newest.get()) {
                        receiver.accept(outcome);
                    }
                }, ui);
    }

    /** Whether the newest request is still being worked on. */
    boolean busy() {
        return !work.isDone();
    }

    /** Gives up what is being worked on; the last outcome stays. */
    void stop() {
        newest.incrementAndGet();
    }

    /** What the newest request ended with that was not meant to happen; null when there is nothing of that kind. */
    Throwable defect() {
        if (!work.isCompletedExceptionally()) {
            return null;
        }
        Throwable cause = work.exceptionNow();
        return cause instanceof CancellationException || cause.getCause() instanceof CancellationException ? null : cause;
    }

    @Override
    public void close() {
        stop();
        worker.shutdownNow();
    }
}
