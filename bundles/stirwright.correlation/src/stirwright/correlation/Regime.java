package stirwright.correlation;

/** The flow regime by a family's own limits. */
public enum Regime {
    LAMINAR("laminar"),
    TRANSITIONAL("transitional"),
    TURBULENT("turbulent");

    private final String id;

    Regime(String id) {
        this.id = id;
    }

    public String id() {
        return id;
    }
}
