package stirwright.conformance;

/**
 * One thing that a contributor has to mend.
 *
 * @param subject what it is about: the id of a correlation or family, or a file and line
 * @param check the name of the check that found it
 * @param message one sentence that says what is wrong and what is expected
 */
public record Finding(String subject, String check, String message) {

    @Override
    public String toString() {
        return subject + ": " + message + " [" + check + "]";
    }
}
