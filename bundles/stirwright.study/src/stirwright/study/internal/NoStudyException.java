package stirwright.study.internal;

/** What keeps bytes from being a study, or a study from becoming bytes; the file is not known here. */
public final class NoStudyException extends Exception {
    private static final long serialVersionUID = 1L;

    /** @param problem is put on one line, since it may quote the file */
    NoStudyException(String problem, Throwable cause) {
        super(problem.replaceAll("[\\p{Cntrl}\\s\\u2028\\u2029]+", " "), cause);
    }

    NoStudyException(String problem) {
        this(problem, null);
    }
}
