package stirwright.conformance.internal;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;
import stirwright.core.CaseRefusedException;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Citation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.FluidClass;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Variable;

/** The case from which the checks set out. Its values are chosen here, for no other reason than to be ordinary. */
final class StandardCase {

    static final FluidClass FLUID = FluidClass.SHEAR_THINNING;
    static final int BAFFLES = 4;

    private static final Map<FluidClass, Double> FLOW_INDEX = Map.of(
            FluidClass.NEWTONIAN, 1.0, FluidClass.SHEAR_THINNING, 0.6,
            FluidClass.SHEAR_THICKENING, 1.3, FluidClass.YIELD_STRESS, 0.5);

    /** Stands in for the family of a relation that holds for any: what every vessel has and no blades. */
    private static final Family ANY = Family.of("anyimpeller", "any impeller")
            .description("A vessel with an impeller of which nothing but the diameter is known.")
            .regimes(RegimeLimits.of(10, 1e4, Citation.commonPractice()))
            .build();

    private StandardCase() {}

    static Family anyFamily() {
        return ANY;
    }

    /** Values, by id, for the parameters that a family gives no default. */
    static Map<String, Double> given(Family family, int baffles) {
        Map<String, Double> given = new HashMap<>();
        for (GeometryParameter parameter : family.parameters()) {
            if (parameter.defaultKind() == GeometryParameter.Default.NONE) {
                double value = parameter.equals(Dimensions.BAFFLE_COUNT) ? baffles
                        : parameter.equals(Dimensions.IMPELLER_DIAMETER) ? 0.3 : ordinary(parameter.kind());
                given.put(parameter.id(), Math.min(Math.max(value, parameter.min()), parameter.max()));
            }
        }
        return given;
    }

    private static double ordinary(GeometryParameter.Kind kind) {
        return switch (kind) {
            case LENGTH -> 0.03;
            case ANGLE -> Math.PI / 4;
            case VOLUME -> 0.05;
            case COUNT -> 3;
            case RATIO -> 1;
        };
    }

    /** Every variable of the contract, and 1 for each of the contributor's own. */
    static Map<Variable, Double> variables(FluidClass fluid, Set<Variable> more) {
        Map<Variable, Double> variables = new LinkedHashMap<>();
        more.forEach(variable -> variables.put(variable, 1.0));
        variables.put(Variable.REYNOLDS, 1000.0);
        variables.put(Variable.FROUDE, 0.1);
        variables.put(Variable.FLOW_INDEX, flowIndex(fluid));
        variables.put(Variable.YIELD_NUMBER, 0.01);
        variables.put(Variable.SPEED, 2.0);
        variables.put(Variable.DENSITY, 1000.0);
        variables.put(Variable.VISCOSITY, 1.0);
        variables.put(Variable.POWER_NUMBER, 2.0);
        variables.put(Variable.FLOW_NUMBER, 0.7);
        return variables;
    }

    static double flowIndex(FluidClass fluid) {
        return FLOW_INDEX.get(fluid);
    }

    /**
     * @throws CaseRefusedException when the family does not allow this geometry
     */
    static Map<GeometryParameter, Double> dimensions(Family family, Map<String, Double> given) {
        VesselGeometry geometry = VesselGeometry.resolve(family, given);
        Map<GeometryParameter, Double> dimensions = new LinkedHashMap<>();
        family.parameters().forEach(parameter -> dimensions.put(parameter, geometry.get(parameter)));
        return dimensions;
    }
}
