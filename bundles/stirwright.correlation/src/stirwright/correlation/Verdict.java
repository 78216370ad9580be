package stirwright.correlation;

/** How a case stands to a bound, from best to worst. */
public enum Verdict {
    INSIDE("inside"),
    /** The source is silent: no pass and no failure. */
    NOT_STATED("not-stated"),
    /** Beyond a stated bound by a little; see {@link Measure#verdict}. */
    NEAR("near"),
    OUTSIDE("outside");

    private final String id;

    Verdict(String id) {
        this.id = id;
    }

    public String id() {
        return id;
    }

    /** Whether a stated bound fails. */
    public boolean fails() {
        return this == NEAR || this == OUTSIDE;
    }

    public Verdict worseOf(Verdict other) {
        return compareTo(other) >= 0 ? this : other;
    }
}
