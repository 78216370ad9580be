package stirwright.exchange;

/** A file cannot be read or written at all; the message is one line that names it and says what to do. */
public final class UnusableFileException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /**
     * @param file as the user named it
     * @param problem what is wrong and what is expected
     */
    public UnusableFileException(Object file, String problem) {
        super(file + ": " + problem);
    }

    public UnusableFileException(Object file, String problem, Throwable cause) {
        super(file + ": " + problem, cause);
    }
}
