package stirwright.correlation;

/** The kind of flow curve, as far as correlations tell fluids apart. */
public enum FluidClass {
    NEWTONIAN("newtonian"),
    SHEAR_THINNING("shear-thinning"),
    SHEAR_THICKENING("shear-thickening"),
    /** With a yield stress, whatever the curve above it. */
    YIELD_STRESS("yield-stress");

    private final String id;

    FluidClass(String id) {
        this.id = id;
    }

    public String id() {
        return id;
    }
}
