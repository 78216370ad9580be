package stirwright.correlation;

import java.util.function.ToDoubleBiFunction;

/** A number of a case that a validity bound can speak of. An open set. */
public final class Measure extends Term {

    /** The bound on it is the first that a source must state. Near reaches to a factor of 1.5. */
    public static final Measure REYNOLDS =
            new Measure("reynolds", "Reynolds number", (g, p) -> p.reynolds(), Nearness.FACTOR);

    public static final Measure FLOW_INDEX = of(Variable.FLOW_INDEX);
    public static final Measure FROUDE = of(Variable.FROUDE);
    public static final Measure BLADE_COUNT = of(Dimensions.BLADE_COUNT);
    public static final Measure BLADE_ANGLE = of("blade_angle", "blade angle in degrees",
            (g, p) -> Math.toDegrees(g.get(Dimensions.BLADE_ANGLE)));
    public static final Measure BAFFLE_COUNT = of(Dimensions.BAFFLE_COUNT);
    public static final Measure IMPELLER_COUNT = of(Dimensions.IMPELLER_COUNT);
    /** Absolute scale. */
    public static final Measure VESSEL_DIAMETER = of(Dimensions.VESSEL_DIAMETER);
    /** Absolute scale. */
    public static final Measure IMPELLER_DIAMETER = of(Dimensions.IMPELLER_DIAMETER);

    public static final Measure D_OVER_T = ratio(Dimensions.IMPELLER_DIAMETER, Dimensions.VESSEL_DIAMETER);
    public static final Measure H_OVER_T = ratio(Dimensions.LIQUID_HEIGHT, Dimensions.VESSEL_DIAMETER);
    public static final Measure C_OVER_T = ratio(Dimensions.CLEARANCE, Dimensions.VESSEL_DIAMETER);
    public static final Measure C_OVER_D = ratio(Dimensions.CLEARANCE, Dimensions.IMPELLER_DIAMETER);
    public static final Measure W_OVER_D = ratio(Dimensions.BLADE_WIDTH, Dimensions.IMPELLER_DIAMETER);
    public static final Measure L_OVER_D = ratio(Dimensions.BLADE_LENGTH, Dimensions.IMPELLER_DIAMETER);
    public static final Measure THICKNESS_OVER_D = ratio(Dimensions.BLADE_THICKNESS, Dimensions.IMPELLER_DIAMETER);
    public static final Measure B_OVER_T = ratio(Dimensions.BAFFLE_WIDTH, Dimensions.VESSEL_DIAMETER);
    public static final Measure S_OVER_D = ratio(Dimensions.IMPELLER_SPACING, Dimensions.IMPELLER_DIAMETER);

    /** How far beyond a stated bound still counts as near. */
    private enum Nearness { FRACTION, FACTOR }

    /** Ratios of given dimensions carry rounding, so a value on a bound may miss it by this share. */
    private static final double ROUNDING = 1e-9;

    private static final double NEAR_FRACTION = 0.10;
    private static final double NEAR_FACTOR = 1.5;

    private final ToDoubleBiFunction<Geometry, OperatingPoint> value;
    private final Nearness nearness;

    private Measure(
            String id, String title, ToDoubleBiFunction<Geometry, OperatingPoint> value, Nearness nearness) {
        super(id, title);
        this.value = value;
        this.nearness = nearness;
    }

    public static Measure of(String id, String title, ToDoubleBiFunction<Geometry, OperatingPoint> value) {
        return new Measure(id, title, value, Nearness.FRACTION);
    }

    /** A variable of the operating point as a measure. */
    public static Measure of(Variable variable) {
        return of(variable.id(), variable.title(), (g, p) -> p.get(variable));
    }

    /** A dimension or count, in its SI unit. */
    public static Measure of(GeometryParameter parameter) {
        String unit = parameter.kind().unit();
        String title = unit.equals("-") ? parameter.title() : parameter.title() + " in " + unit;
        return of(parameter.id(), title, (g, p) -> g.get(parameter));
    }

    /** One dimension over another, called for instance "D/T". */
    public static Measure ratio(GeometryParameter over, GeometryParameter under) {
        return of(over.id() + "-over-" + under.id(), over.symbol() + "/" + under.symbol(), (g, p) -> g.ratio(over, under));
    }

    public double value(Geometry geometry, OperatingPoint point) {
        return value.applyAsDouble(geometry, point);
    }

    /**
     * How a value stands to a closed range: inside; near when beyond it by at most a tenth of the
     * bound (for the Reynolds number by a factor of at most 1.5); else outside. NaN is outside.
     */
    public Verdict verdict(double found, double least, double most) {
        if (found >= least - ROUNDING * Math.abs(least) && found <= most + ROUNDING * Math.abs(most)) {
            return Verdict.INSIDE;
        }
        boolean near = switch (nearness) {
            case FACTOR -> found >= least / NEAR_FACTOR && found <= most * NEAR_FACTOR;
            case FRACTION -> found >= least - NEAR_FRACTION * Math.abs(least)
                    && found <= most + NEAR_FRACTION * Math.abs(most);
        };
        return near ? Verdict.NEAR : Verdict.OUTSIDE;
    }
}
