package stirwright.study;

/** A study cannot be read or written; the message is one sentence that names the file, the place and what to do. */
public final class StudyFileException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final String problem;

    /**
     * @param file as the user named it
     * @param problem the place, what is wrong there and what to do
     */
    public StudyFileException(Object file, String problem, Throwable cause) {
        super(file + ": " + problem, cause);
        this.problem = problem;
    }

    public StudyFileException(Object file, String problem) {
        this(file, problem, null);
    }

    /** The message without the file. */
    public String problem() {
        return problem;
    }
}
