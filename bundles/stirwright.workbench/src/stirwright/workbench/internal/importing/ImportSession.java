package stirwright.workbench.internal.importing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Executor;
import java.util.function.Supplier;
import stirwright.exchange.CurveImport;
import stirwright.exchange.CurveSource;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.UnusableFileException;
import stirwright.workbench.internal.session.Recalculator;

/**
 * A source that is being looked at before anything is taken from it: what was found, and what somebody overruled. On the user
 * interface's thread; the source is read on another one.
 */
final class ImportSession implements AutoCloseable {
    private final String name;
    private final Supplier<CurveSource> open;
    private final Recalculator<Reading> reader;
    private final List<Runnable> listeners = new ArrayList<>();
    private final List<Runnable> requests = new ArrayList<>();
    /** Read once, by the thread that reads. */
    private volatile CurveSource source;
    private ImportChoice choice = ImportChoice.DETECT;
    private Reading reading;

    /**
     * @param name what the source is called until it is read
     * @param open reads its bytes; may throw {@link UnusableFileException}
     * @param ui runs what touches widgets, later and in order
     */
    ImportSession(String name, Supplier<CurveSource> open, Executor ui) {
        this.name = name;
        this.open = open;
        this.reader = new Recalculator<>("stirwright-import", ui, this::take, () -> requests.forEach(Runnable::run));
    }

    /** Reads the source anew with another choice. */
    void choose(ImportChoice other) {
        choice = other;
        reader.request(stale -> read(other));
        requests.forEach(Runnable::run);
    }

    private Reading read(ImportChoice by) {
        try {
            if (source == null) {
                source = open.get();
            }
            return new Reading(Optional.of(CurveImport.of(source, by)), "");
        } catch (UnusableFileException unusable) {
            return new Reading(Optional.empty(), unusable.getMessage());
        }
    }

    private void take(Reading fresh) {
        reading = fresh;
        listeners.forEach(Runnable::run);
    }

    String name() {
        return name;
    }

    ImportChoice choice() {
        return choice;
    }

    /** What was read last; empty until the first reading is through. */
    Optional<Reading> reading() {
        return Optional.ofNullable(reading);
    }

    /** What was found; empty while nothing can be shown. */
    Optional<CurveImport> found() {
        return reading().flatMap(Reading::found);
    }

    /** Whether what is shown is what the choice gives. */
    boolean fresh() {
        return reading != null && !reader.busy() && !reader.stopped() && reader.defect() == null;
    }

    boolean busy() {
        return reader.busy();
    }

    boolean stopped() {
        return reader.stopped();
    }

    /** Gives up what is being read; what is shown stays. */
    void stop() {
        reader.stop();
    }

    /** A defect of the program; null when there is none. */
    Throwable defect() {
        return reader.defect();
    }

    /** Called when something was read. */
    void onReading(Runnable listener) {
        listeners.add(listener);
    }

    /** Called when a reading begins, is given up or fails. */
    void onRequest(Runnable listener) {
        requests.add(listener);
    }

    @Override
    public void close() {
        reader.close();
    }
}
