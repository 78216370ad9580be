package stirwright.conformance.internal;

/** Where a check puts what it finds. */
@FunctionalInterface
public interface Findings {

    /**
     * @param about id of a correlation or family, or a file and line
     * @param message one sentence that says what is wrong and what is expected
     */
    void add(String about, String message);
}
