package stirwright.correlation;

import java.util.function.BiFunction;

/**
 * A class of a case that a validity bound can speak of, for instance baffled or not. An open set. The
 * functions are stateless and may be called from several threads at once.
 */
public final class Classifier extends Term {

    public static final String BAFFLED = "baffled";
    public static final String UNBAFFLED = "unbaffled";

    /** {@link #BAFFLED} or {@link #UNBAFFLED}. How strongly baffled is for number bounds to say. */
    public static final Classifier BAFFLING =
            of("baffling", "vessel", (g, p) -> g.get(Dimensions.BAFFLE_COUNT) > 0 ? BAFFLED : UNBAFFLED);

    /** The id of the {@link FluidClass}. */
    public static final Classifier FLUID = of("fluid", "fluid", (g, p) -> p.fluid().id());

    private final BiFunction<Geometry, OperatingPoint, String> label;

    private Classifier(String id, String title, BiFunction<Geometry, OperatingPoint, String> label) {
        super(id, title);
        this.label = label;
    }

    public static Classifier of(String id, String title, BiFunction<Geometry, OperatingPoint, String> label) {
        return new Classifier(id, title, label);
    }

    public String label(Geometry geometry, OperatingPoint point) {
        return label.apply(geometry, point);
    }
}
