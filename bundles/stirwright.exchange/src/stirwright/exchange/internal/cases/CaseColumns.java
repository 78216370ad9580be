package stirwright.exchange.internal.cases;

import java.util.Arrays;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import stirwright.core.Catalogue;
import stirwright.core.Choices;
import stirwright.correlation.GeometryParameter;
import stirwright.exchange.CaseField;
import stirwright.exchange.CaseFields;
import stirwright.rheology.ModelKind;
import stirwright.rheology.Parameter;

/** The names of a case table's columns: those of the contract, and the dimensions of every family. */
public final class CaseColumns {
    public static final String CASE = "case";
    public static final String FAMILY = "family";
    public static final String CORRELATION = "correlation";
    public static final String SHEAR_RATE_CORRELATION = "shear_rate_correlation";
    public static final String FLOW_NUMBER_CORRELATION = "flow_number_correlation";
    public static final String IMPELLER_DIAMETER = "impeller_diameter_m";
    public static final String SPEED_RPM = "speed_rpm";
    public static final String SPEED_REV_S = "speed_rev_s";
    public static final String TARGET_SHEAR_RATE = "target_shear_rate_1_s";
    public static final String TARGET_POWER_PER_VOLUME = "target_power_per_volume_W_m3";
    public static final String TARGET_TIP_SPEED = "target_tip_speed_m_s";
    public static final String DENSITY = "density_kg_m3";
    public static final String MODEL = "model";
    public static final String SHEAR_RATE_CONSTANT = "shear_rate_constant";
    public static final String POWER_NUMBER = "power_number";
    public static final String FLOW_NUMBER = "flow_number";
    public static final String SHEAR_RATE_MIN = "shear_rate_min_1_s";
    public static final String SHEAR_RATE_MAX = "shear_rate_max_1_s";
    public static final String YIELD_STRESS_LOW = "yield_stress_low_Pa";
    public static final String YIELD_STRESS_HIGH = "yield_stress_high_Pa";
    public static final String STATIC_YIELD_STRESS = "static_yield_stress_Pa";

    public static final String EFFECTS_LEFT_OUT = Choices.EFFECTS_LEFT_OUT;
    public static final String CONSTANTS = Choices.CONSTANTS;

    private static final List<String> TEXTS = List.of(CASE, FAMILY, CORRELATION, SHEAR_RATE_CORRELATION,
            FLOW_NUMBER_CORRELATION, MODEL, EFFECTS_LEFT_OUT, CONSTANTS);

    /** Known whichever families are installed, so that no row changes its meaning when one leaves. */
    private static final List<String> DIMENSIONS = List.of(
            IMPELLER_DIAMETER, "blade_count", "blade_width_m", "blade_angle_deg", "blade_thickness_m",
            "blade_length_m", "pitch_ratio", "impeller_height_m", "ribbon_width_m", "ribbon_count",
            "shaft_diameter_m", "draft_tube_diameter_m", "wall_gap_m", "impeller_count", "impeller_spacing_m",
            "clearance_m", "vessel_diameter_m", "liquid_height_m", "liquid_volume_m3", "baffle_count",
            "baffle_width_m");

    /** What settles the speed; a row gives exactly one. */
    static final List<String> SPEEDS = columns(CaseFields.SPEEDS);

    static final List<String> REQUIRED = List.of(CASE, FAMILY, IMPELLER_DIAMETER, DENSITY, MODEL);

    private static final List<String> OTHER_NUMBERS = columns(List.of(CaseFields.DENSITY), CaseFields.GIVEN,
            CaseFields.MEASURED_WINDOW, CaseFields.YIELD_BOUNDS, List.of(CaseFields.STATIC_YIELD_STRESS));

    private final Set<String> dimensions = new LinkedHashSet<>(DIMENSIONS);
    private final Set<String> numeric = new LinkedHashSet<>();

    public CaseColumns(Catalogue catalogue) {
        catalogue.families().forEach(f -> f.parameters().stream().map(GeometryParameter::column).forEach(dimensions::add));
        Stream.of(dimensions, SPEEDS, modelParameters(), OTHER_NUMBERS).forEach(numeric::addAll);
    }

    /** Every column that the contract names, in no order that matters. */
    public static Set<String> ofContract() {
        Set<String> all = new LinkedHashSet<>();
        Stream.of(TEXTS, DIMENSIONS, SPEEDS, modelParameters(), OTHER_NUMBERS).forEach(all::addAll);
        return all;
    }

    /** The columns of all models' parameters, each once. */
    static List<String> modelParameters() {
        return Arrays.stream(ModelKind.values())
                .flatMap(k -> k.parameters().stream())
                .map(Parameter::column)
                .distinct()
                .toList();
    }

    @SafeVarargs
    private static List<String> columns(List<CaseField>... fields) {
        return Stream.of(fields).flatMap(List::stream).map(CaseField::column).toList();
    }

    /** Dimensions of the vessel and the impeller. */
    Set<String> dimensions() {
        return dimensions;
    }

    boolean isNumeric(String column) {
        return numeric.contains(column);
    }

    /** Whether its cells hold numbers, alone or behind equal signs. */
    boolean showsDecimals(String column) {
        return isNumeric(column) || column.equals(CONSTANTS);
    }

    boolean isKnown(String column) {
        return numeric.contains(column) || TEXTS.contains(column);
    }
}
