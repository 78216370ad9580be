package stirwright.exchange;

/**
 * One thing that was found out about a source before anything is taken from it.
 *
 * @param value what is used
 * @param reason why, or who said so
 * @param overruled whether the choice says so instead of the source
 */
public record Finding(Topic topic, String value, String reason, boolean overruled) {

    /** What a finding speaks of. */
    public enum Topic {
        FORM("form"),
        ENCODING("encoding"),
        SEPARATOR("separator"),
        DECIMAL_SIGN("decimal sign"),
        SHEETS("sheets"),
        LAYOUT("layout"),
        COLUMN("column"),
        STATUS("status words"),
        BLOCKS("blocks");

        private final String words;

        Topic(String words) {
            this.words = words;
        }

        public String words() {
            return words;
        }
    }

    /** On one line. */
    public String words() {
        return topic.words() + ": " + value + " (" + reason + ")";
    }
}
