package stirwright.exchange;

/** Which way the shear rate went while a curve was measured. */
public enum Ramp {
    UP("up"),
    DOWN("down"),
    /** Neither, or the points stand in no order. */
    NONE("");

    private final String word;

    Ramp(String word) {
        this.word = word;
    }

    /** "up", "down" or nothing. */
    public String word() {
        return word;
    }
}
