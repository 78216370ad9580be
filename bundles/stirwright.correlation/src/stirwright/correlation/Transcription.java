package stirwright.correlation;

/** How the coefficients came here and were checked; earlier is better. */
public enum Transcription {
    /** Read in the printed source or in a public transcription of it. */
    CHECKED_AGAINST_SOURCE("checked against the source"),
    /** From memory, and confirmed by an independent numeric check. */
    CHECKED_NUMERICALLY("from memory, checked numerically"),
    /** From memory, every digit sure. */
    FROM_MEMORY("from memory"),
    /** From memory, some digit or exponent may be wrong; shown, never recommended. */
    UNSURE("from memory, unsure");

    private final String words;

    Transcription(String words) {
        this.words = words;
    }

    public String words() {
        return words;
    }
}
