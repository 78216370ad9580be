package stirwright.workbench.internal.session;

import java.util.concurrent.CompletableFuture;
import java.util.concurrent.Executor;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.BooleanSupplier;
import java.util.function.Consumer;
import java.util.function.Function;

/**
 * Computes off the user interface's thread. Only the newest request counts: one that is overtaken while it waits or runs is
 * given up, so typing never queues work.
 */
public final class Recalculator<A> implements AutoCloseable {
    private final ExecutorService worker;
    private final AtomicLong newest = new AtomicLong();
    private final Executor ui;
    private final Consumer<A> receiver;
    private final Runnable failed;
    /** The request whose outcome was delivered last, or given up by hand. */
    private volatile long settled;
    private volatile Throwable defect;
    private volatile boolean stopped;

    /**
     * @param thread what its thread is called
     * @param ui runs what touches widgets
     * @param receiver of each outcome that is still wanted, called by {@code ui}
     * @param failed called by {@code ui} when a request ends in a defect or is stopped by hand
     */
    public Recalculator(String thread, Executor ui, Consumer<A> receiver, Runnable failed) {
        this.worker = Executors.newSingleThreadExecutor(task -> Thread.ofPlatform().daemon().name(thread).unstarted(task));
        this.ui = ui;
        this.receiver = receiver;
        this.failed = failed;
    }

    /**
     * Asks for an outcome.
     *
     * @param work gets what says now and then whether its outcome is still wanted; once it is not, it may throw
     */
    public void request(Function<BooleanSupplier, A> work) {
        long mine = newest.incrementAndGet();
        stopped = false;
        CompletableFuture.supplyAsync(() -> work.apply(() -> mine != newest.get()), worker)
                // Handed over and not chained: what a listener throws must reach the event loop and not end in a future.
                .whenComplete((outcome, failure) -> ui.execute(() -> settle(mine, outcome, failure)));
    }

    private void settle(long mine, A outcome, Throwable failure) {
        if (mine != newest.get()) {
            return;
        }
        settled = mine;
        defect = failure;
        if (failure == null) {
            receiver.accept(outcome);
        } else {
            failed.run();
        }
    }

    /** Whether an outcome is still to come. */
    public boolean busy() {
        return settled != newest.get();
    }

    /** Gives up what is being worked on; the last outcome stays, and is known to be of an earlier input. */
    public void stop() {
        stopped |= busy();
        settled = newest.incrementAndGet();
        failed.run();
    }

    /** Gives up what is being worked on, since another outcome takes its place. */
    public void drop() {
        stopped = false;
        defect = null;
        settled = newest.incrementAndGet();
    }

    /** Whether the last outcome is not that of the newest request, because that was stopped by hand. */
    public boolean stopped() {
        return stopped;
    }

    /** What ended the newest request instead of an outcome; null when nothing did. */
    public Throwable defect() {
        return defect;
    }

    @Override
    public void close() {
        newest.incrementAndGet();
        worker.shutdownNow();
    }
}
