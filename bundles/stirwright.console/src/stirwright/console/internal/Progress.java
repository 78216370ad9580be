package stirwright.console.internal;

import java.io.PrintWriter;

/**
 * A line that counts up on standard error once the work takes longer than half a second. Shown only
 * when a person watches, which the start script knows and says by a system property.
 */
final class Progress {
    static final boolean WATCHED = Boolean.getBoolean("stirwright.watched");

    private static final long AFTER_NANOS = 500_000_000L;

    private final PrintWriter err;
    private final String things;
    private final int total;
    private final long start = System.nanoTime();
    private boolean shown;

    Progress(PrintWriter err, String things, int total) {
        this.err = err;
        this.things = things;
        this.total = total;
    }

    /** May be called by several threads. */
    synchronized void reached(int count) {
        if (WATCHED && count < total && System.nanoTime() - start > AFTER_NANOS) {
            err.print("\r" + count + " of " + total + " " + things + " (Ctrl-C stops) ");
            err.flush();
            shown = true;
        }
    }

    void done() {
        if (shown) {
            err.print("\r" + " ".repeat(60) + "\r");
            err.flush();
        }
    }
}
