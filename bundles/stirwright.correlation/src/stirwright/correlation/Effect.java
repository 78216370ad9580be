package stirwright.correlation;

/**
 * Something about the vessel that changes a quantity. A correlation lists the effects that it
 * already contains; a modifier for one of them is then never applied to it. An open set.
 */
public final class Effect extends Term {
    public static final Effect CLEARANCE = of("clearance", "clearance above the bottom");
    public static final Effect DIAMETER_RATIO = of("diameter-ratio", "impeller over vessel diameter");
    public static final Effect LIQUID_DEPTH = of("liquid-depth", "liquid depth");
    public static final Effect BAFFLES = of("baffles", "baffle count and width");
    public static final Effect BLADE_COUNT = of("blade-count", "blade count");
    public static final Effect THICKNESS = of("thickness", "blade or disc thickness");
    public static final Effect SEVERAL_IMPELLERS = of("several-impellers", "several impellers on the shaft");
    public static final Effect FROUDE = of("froude", "surface deformation without baffles (Froude number)");

    private Effect(String id, String title) {
        super(id, title);
    }

    public static Effect of(String id, String title) {
        return new Effect(id, title);
    }
}
