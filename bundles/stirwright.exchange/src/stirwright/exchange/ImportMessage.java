package stirwright.exchange;

/**
 * One line that a reader of an import should see.
 *
 * @param words what happened, where, and what to do
 */
public record ImportMessage(Weight weight, String words) {

    /** How much a message matters. */
    public enum Weight {
        /** What was found. */
        NOTE,
        /** The curves can be wrong. */
        WARNING,
        /** Something could not be read at all. */
        PROBLEM
    }

    /** The words, after "warning" or "problem" where it is one. */
    String marked() {
        return switch (weight) {
            case NOTE -> words;
            case WARNING -> "warning: " + words;
            case PROBLEM -> "problem: " + words;
        };
    }
}
