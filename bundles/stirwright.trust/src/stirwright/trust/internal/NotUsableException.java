package stirwright.trust.internal;

/** A file cannot become a bundle; the message says why, as the rest of a sentence about the file. */
final class NotUsableException extends Exception {
    private static final long serialVersionUID = 1;

    NotUsableException(String message) {
        super(message);
    }
}
