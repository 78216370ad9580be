package stirwright.core;

/** What a candidate is to its case. */
public enum Role {
    RECOMMENDED("recommended"),
    /** Asked for in the case. */
    CHOSEN("chosen"),
    /** Qualifies. */
    CANDIDATE("candidate"),
    /** Does not qualify; the reason is given. */
    EXCLUDED("excluded");

    private final String id;

    Role(String id) {
        this.id = id;
    }

    public String id() {
        return id;
    }
}
