package stirwright.exchange;

/**
 * Takes items one at a time and keeps none. Use it with try-with-resources, and call
 * {@link #finish} once everything was added. Not thread-safe.
 */
public interface Output<T> extends AutoCloseable {

    /**
     * @throws UnusableFileException when a file cannot be written
     * @throws java.io.UncheckedIOException when a writer that the caller handed over fails
     */
    void add(T item);

    /**
     * Completes the output; a file appears under its name only now.
     *
     * @throws UnusableFileException when a file cannot be written
     * @throws java.io.UncheckedIOException when a writer that the caller handed over fails
     */
    void finish();

    /** Drops a file that was not finished. */
    @Override
    void close();
}
