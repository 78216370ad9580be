package stirwright.study.internal;

/** What keeps bytes from being a study, or a study from becoming bytes; the file is not known here. */
public final class NoStudyException extends Exception {
    private static final long serialVersionUID = 1L;

    NoStudyException(String problem, Throwable cause) {
        super(problem, cause);
    }

    NoStudyException(String problem) {
        this(problem, null);
    }
}
