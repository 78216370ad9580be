package stirwright.console.internal;

import java.io.PrintWriter;
import java.util.Timer;
import java.util.TimerTask;

/**
 * A line on standard error for one piece of work that says nothing of its progress, once it takes longer than half a
 * second. Shown only when a person watches, as {@link Progress} is.
 */
final class Waiting implements AutoCloseable {
    private static final long AFTER_MILLIS = 500;

    private final PrintWriter err;
    private final Timer timer = new Timer(true);
    private int shown;

    Waiting(PrintWriter err, String work) {
        this.err = err;
        if (Progress.WATCHED) {
            timer.schedule(new TimerTask() {
                @Override
                public void run() {
                    show(work + " ... (Ctrl-C stops) ");
                }
            }, AFTER_MILLIS);
        }
    }

    private synchronized void show(String line) {
        if (shown == 0) {
            err.print("\r" + line);
            err.flush();
            shown = line.length();
        }
    }

    @Override
    public synchronized void close() {
        timer.cancel();
        if (shown > 0) {
            err.print("\r" + " ".repeat(shown) + "\r");
            err.flush();
        }
        shown = -1;
    }
}
