package stirwright.conformance;

/** A file cannot be checked at all; the message says what it is and what was expected. */
public final class JarRefusedException extends Exception {
    private static final long serialVersionUID = 1L;

    public JarRefusedException(String message) {
        super(message);
    }
}
