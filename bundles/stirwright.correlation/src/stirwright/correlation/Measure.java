package stirwright.correlation;

import java.util.Optional;
import java.util.function.ToDoubleBiFunction;

/**
 * A number of a case that a validity bound can speak of. An open set. The functions are stateless
 * and may be called from several threads at once.
 */
public final class Measure extends Term {

    /** The bound on it is the first that a source must state. Near reaches to a factor of 1.5. */
    public static final Measure REYNOLDS = of(Variable.REYNOLDS).byFactor();

    public static final Measure FLOW_INDEX = of(Variable.FLOW_INDEX);
    public static final Measure FROUDE = of(Variable.FROUDE);
    public static final Measure BLADE_COUNT = of(Dimensions.BLADE_COUNT);
    /** In degrees. */
    public static final Measure BLADE_ANGLE = of(Dimensions.BLADE_ANGLE);
    public static final Measure BAFFLE_COUNT = of(Dimensions.BAFFLE_COUNT);
    public static final Measure IMPELLER_COUNT = of(Dimensions.IMPELLER_COUNT);
    /** Absolute scale, in m. */
    public static final Measure VESSEL_DIAMETER = of(Dimensions.VESSEL_DIAMETER);
    /** Absolute scale, in m. */
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

    /** Common practice, no source; as the case table's contract says. */
    private static final double NEAR_FRACTION = 0.10;

    /** Common practice, no source; as the case table's contract says. */
    private static final double NEAR_FACTOR = 1.5;

    private final ToDoubleBiFunction<Geometry, OperatingPoint> value;
    private final Nearness nearness;
    private final Optional<Variable> variable;

    private Measure(
            String id, String title, ToDoubleBiFunction<Geometry, OperatingPoint> value, Nearness nearness,
            Optional<Variable> variable) {
        super(id, title);
        this.value = value;
        this.nearness = nearness;
        this.variable = variable;
    }

    /** A number computed from the case; near reaches to a tenth beyond a bound. */
    public static Measure of(String id, String title, ToDoubleBiFunction<Geometry, OperatingPoint> value) {
        return new Measure(id, title, value, Nearness.FRACTION, Optional.empty());
    }

    /** A variable of the operating point as a measure, in its SI unit. */
    public static Measure of(Variable variable) {
        return new Measure(variable.id(), variable.title(), (g, p) -> p.get(variable), Nearness.FRACTION,
                Optional.of(variable));
    }

    /** A dimension or count in the unit of its column, angles in degrees; its id is the column's name. */
    public static Measure of(GeometryParameter parameter) {
        String unit = parameter.kind().columnUnit();
        String title = unit.equals("-") ? parameter.title() : parameter.title() + " in " + unit;
        return of(parameter.column(), title, (g, p) -> parameter.toColumn(g.get(parameter)));
    }

    /** The same measure with near reaching to a factor of 1.5: for numbers that span decades. */
    public Measure byFactor() {
        return new Measure(id(), title(), value, Nearness.FACTOR, variable);
    }

    /** One dimension over another, called for instance "D/T". */
    public static Measure ratio(GeometryParameter over, GeometryParameter under) {
        return of(over.id() + "-over-" + under.id(), over.symbol() + "/" + under.symbol(), (g, p) -> g.ratio(over, under));
    }

    /** The variable that this measure is; empty when it is computed from more than that. */
    public Optional<Variable> variable() {
        return variable;
    }

    /** The number that a case has. */
    public double value(Geometry geometry, OperatingPoint point) {
        return value.applyAsDouble(geometry, point);
    }

    /**
     * How a value stands to a closed range: inside; near when beyond it by at most a tenth of the
     * bound (by a factor of at most 1.5 for the Reynolds number and what else goes {@link
     * #byFactor}); else outside. NaN is outside.
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
