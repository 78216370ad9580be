package stirwright.conformance.internal;

/** A file is not a bundle; the message names the file and says what is missing. */
public final class NotABundleException extends Exception {
    private static final long serialVersionUID = 1L;

    NotABundleException(String message) {
        super(message);
    }
}
