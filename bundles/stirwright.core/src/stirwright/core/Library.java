package stirwright.core;

/** What the installed bundles contribute at this moment. Families arrive and leave at run time. */
public interface Library {

    /** An immutable snapshot; ask again to see what has come or gone. */
    Catalogue catalogue();

    /**
     * Has a listener called after each arrival and departure, on whatever thread that happens; it should do no more
     * than note that the catalogue changed. Closing what is returned ends it.
     */
    Listening listen(Runnable listener);

    /** Ends the calls to a listener. */
    interface Listening extends AutoCloseable {
        @Override
        void close();
    }
}
