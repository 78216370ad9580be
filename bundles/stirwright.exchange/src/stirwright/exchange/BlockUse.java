package stirwright.exchange;

/** What a block of points is. Blocks that are ramps are taken unless somebody says otherwise, others are not. */
public enum BlockUse {
    UP("flow curve up", Ramp.UP, true),
    DOWN("flow curve down", Ramp.DOWN, true),
    /** Rates of a flow curve that neither rise nor fall throughout. */
    UNORDERED("flow curve, rates in no order", Ramp.NONE, true),
    /** A rest, a recovery or a step test. */
    CONSTANT_RATE("constant shear rate", Ramp.NONE, false),
    /** Shearing before the measurement; never part of a flow curve. */
    PRE_SHEAR("pre-shear", Ramp.NONE, false),
    OTHER("no flow curve", Ramp.NONE, false);

    private final String words;
    private final Ramp ramp;
    private final boolean curve;

    BlockUse(String words, Ramp ramp, boolean curve) {
        this.words = words;
        this.ramp = ramp;
        this.curve = curve;
    }

    public String words() {
        return words;
    }

    public Ramp ramp() {
        return ramp;
    }

    /** Whether a block of this kind is a flow curve, and so is taken by default. */
    public boolean isCurve() {
        return curve;
    }
}
