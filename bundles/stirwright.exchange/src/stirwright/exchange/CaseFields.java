package stirwright.exchange;

import java.util.List;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.GeometryParameter.Kind;
import stirwright.correlation.Variable;
import stirwright.exchange.internal.cases.CaseColumns;
import stirwright.rheology.ModelKind;

/** The numbers that a case is made of: all columns of the case table that hold one. */
public final class CaseFields {
    public static final CaseField SPEED_RPM =
            new CaseField(CaseColumns.SPEED_RPM, Variable.SPEED.title(), Variable.SPEED.symbol(), "rev/min");
    public static final CaseField SPEED_REV_S = of(CaseColumns.SPEED_REV_S, Variable.SPEED);
    public static final CaseField TARGET_SHEAR_RATE =
            new CaseField(CaseColumns.TARGET_SHEAR_RATE, "target shear rate", "g", "1/s");
    public static final CaseField TARGET_POWER_PER_VOLUME =
            new CaseField(CaseColumns.TARGET_POWER_PER_VOLUME, "target power per volume", "P/V", "W/m3");
    public static final CaseField TARGET_TIP_SPEED =
            new CaseField(CaseColumns.TARGET_TIP_SPEED, "target tip speed", "pi N D", "m/s");
    public static final CaseField DENSITY = of(CaseColumns.DENSITY, Variable.DENSITY);
    public static final CaseField SHEAR_RATE_CONSTANT =
            of(CaseColumns.SHEAR_RATE_CONSTANT, Variable.SHEAR_RATE_CONSTANT);
    public static final CaseField POWER_NUMBER = of(CaseColumns.POWER_NUMBER, Variable.POWER_NUMBER);
    public static final CaseField FLOW_NUMBER = of(CaseColumns.FLOW_NUMBER, Variable.FLOW_NUMBER);
    public static final CaseField SHEAR_RATE_MIN =
            new CaseField(CaseColumns.SHEAR_RATE_MIN, "least shear rate measured", "g min", "1/s");
    public static final CaseField SHEAR_RATE_MAX =
            new CaseField(CaseColumns.SHEAR_RATE_MAX, "greatest shear rate measured", "g max", "1/s");
    public static final CaseField YIELD_STRESS_LOW =
            new CaseField(CaseColumns.YIELD_STRESS_LOW, "lowest yield stress", "ty min", "Pa");
    public static final CaseField YIELD_STRESS_HIGH =
            new CaseField(CaseColumns.YIELD_STRESS_HIGH, "highest yield stress", "ty max", "Pa");
    public static final CaseField STATIC_YIELD_STRESS =
            new CaseField(CaseColumns.STATIC_YIELD_STRESS, "static yield stress", "ty static", "Pa",
                    "stress at which the product starts to flow after rest; measured with a vane or a stress ramp");

    /** What settles the speed; a case gives exactly one. */
    public static final List<CaseField> SPEEDS =
            List.of(SPEED_RPM, SPEED_REV_S, TARGET_SHEAR_RATE, TARGET_POWER_PER_VOLUME, TARGET_TIP_SPEED);

    /** Values that a case may give in place of a correlation. */
    public static final List<CaseField> GIVEN = List.of(SHEAR_RATE_CONSTANT, POWER_NUMBER, FLOW_NUMBER);

    /** The shear rates between which the fluid was measured. */
    public static final List<CaseField> MEASURED_WINDOW = List.of(SHEAR_RATE_MIN, SHEAR_RATE_MAX);

    /** Between what the yield stress may lie; only for models that have one, see {@link #yieldBounds}. */
    public static final List<CaseField> YIELD_BOUNDS = List.of(YIELD_STRESS_LOW, YIELD_STRESS_HIGH);

    private static final List<GeometryParameter> OF_VESSEL = List.of(
            Dimensions.VESSEL_DIAMETER, Dimensions.LIQUID_HEIGHT, Dimensions.LIQUID_VOLUME, Dimensions.BAFFLE_COUNT,
            Dimensions.BAFFLE_WIDTH);

    private CaseFields() {}

    /** The dimensions of the vessel and its contents, in the order in which the family fills blanks. */
    public static List<CaseField> vessel(Family family) {
        return family.parameters().stream().filter(OF_VESSEL::contains).map(CaseFields::of).toList();
    }

    /** The dimensions of the impeller and its place in the vessel, in the order in which the family fills blanks. */
    public static List<CaseField> impeller(Family family) {
        return family.parameters().stream().filter(p -> !OF_VESSEL.contains(p)).map(CaseFields::of).toList();
    }

    /** The parameters of a fluid model, in the order of {@link ModelKind#parameters}. */
    public static List<CaseField> model(ModelKind kind) {
        return kind.parameters().stream().map(p -> new CaseField(p.column(), p.title(), p.symbol(), p.unit())).toList();
    }

    /** {@link #YIELD_BOUNDS} for a model with a yield stress, else none. */
    public static List<CaseField> yieldBounds(ModelKind kind) {
        return kind.yields() ? YIELD_BOUNDS : List.of();
    }

    /** A dimension in the unit of its column, angles in degrees. */
    public static CaseField of(GeometryParameter parameter) {
        String unit = parameter.kind() == Kind.ANGLE ? "deg" : parameter.kind().columnUnit();
        return new CaseField(parameter.column(), parameter.title(), parameter.symbol(), unit, parameter.meaning());
    }

    private static CaseField of(String column, Variable variable) {
        return new CaseField(column, variable.title(), variable.symbol(), variable.unit());
    }
}
