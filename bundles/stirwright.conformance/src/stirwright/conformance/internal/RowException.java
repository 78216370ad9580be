package stirwright.conformance.internal;

/** A reference row cannot be read; the message names the column and the value. */
final class RowException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    RowException(String message) {
        super(message, null, false, false);
    }
}
