package stirwright.cards.internal;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;
import java.util.function.UnaryOperator;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import stirwright.conformance.Proof;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Bound;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.FluidClass;
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.Measure;
import stirwright.correlation.OperatingPoint;
import stirwright.correlation.Variable;

/** A vessel and a state of its product that a plot can move through. */
record PlotCase(Family family, Map<GeometryParameter, Double> dimensions, Map<Variable, Double> variables, FluidClass fluid)
        implements Geometry, OperatingPoint {

    /** In m; where the family's defaults are drawn. */
    private static final double DIAMETER = 0.5;
    private static final int BAFFLES = 4;

    /** Where a variable that nobody gave is put. */
    private static final double FLOW_INDEX = 0.5;
    private static final double REYNOLDS = 1e3;

    /** The impeller and the state of a reference row. */
    static PlotCase of(Correlation card, Proof.Row row) {
        return of(row.family(), row.geometry(), variables(card).stream().filter(v -> !Double.isNaN(row.point().get(v)))
                .collect(Collectors.toMap(v -> v, row.point()::get)), row.point().fluid());
    }

    /**
     * The family's standard impeller.
     *
     * @throws stirwright.core.CaseRefusedException when the family has no default for some dimension
     */
    static PlotCase standard(Correlation card, Family family, int baffles) {
        Map<String, Double> given = Map.of(Dimensions.IMPELLER_DIAMETER.id(), DIAMETER, Dimensions.BAFFLE_COUNT.id(), (double) baffles);
        Map<Variable, Double> variables = new LinkedHashMap<>();
        variables(card).forEach(v -> variables.put(v, v.equals(Variable.REYNOLDS) ? REYNOLDS : v.equals(Variable.FLOW_INDEX) ? FLOW_INDEX : 1));
        return of(family, VesselGeometry.resolve(family, given), variables, FluidClass.SHEAR_THINNING);
    }

    /** With baffles and without. */
    static Stream<PlotCase> standards(Correlation card, Family family) {
        return Stream.of(BAFFLES, 0).map(baffles -> standard(card, family, baffles));
    }

    private static PlotCase of(Family family, Geometry geometry, Map<Variable, Double> variables, FluidClass fluid) {
        Map<GeometryParameter, Double> dimensions = new LinkedHashMap<>();
        family.parameters().forEach(parameter -> dimensions.put(parameter, geometry.get(parameter)));
        return new PlotCase(family, dimensions, variables, fluid);
    }

    /** Those that the formula or a bound reads. */
    private static Set<Variable> variables(Correlation card) {
        return Stream.concat(card.reads().stream(), card.validity().stream().map(Bound::subject)
                .flatMap(subject -> subject instanceof Measure measure ? measure.variable().stream() : Stream.empty()))
                .collect(Collectors.toSet());
    }

    @Override
    public double get(GeometryParameter parameter) {
        return dimensions.getOrDefault(parameter, Double.NaN);
    }

    @Override
    public double get(Variable variable) {
        return variables.getOrDefault(variable, Double.NaN);
    }

    PlotCase with(Variable variable, double value) {
        Map<Variable, Double> changed = new LinkedHashMap<>(variables);
        changed.put(variable, value);
        return new PlotCase(family, dimensions, changed, fluid);
    }

    PlotCase with(GeometryParameter parameter, double value) {
        return change(map -> {
            map.put(parameter, value);
            return map;
        });
    }

    /** Another vessel around the same impeller: H/T, C/T and B/T stay. */
    PlotCase inVessel(double diameter) {
        double scale = diameter / get(Dimensions.VESSEL_DIAMETER);
        return change(map -> {
            for (GeometryParameter each : Set.of(Dimensions.VESSEL_DIAMETER, Dimensions.LIQUID_HEIGHT, Dimensions.CLEARANCE,
                    Dimensions.BAFFLE_WIDTH)) {
                map.computeIfPresent(each, (p, value) -> value * scale);
            }
            map.computeIfPresent(Dimensions.LIQUID_VOLUME, (p, value) -> value * scale * scale * scale);
            map.computeIfPresent(Dimensions.WALL_GAP, (p, value) -> (diameter - get(Dimensions.IMPELLER_DIAMETER)) / 2);
            return map;
        });
    }

    private PlotCase change(UnaryOperator<Map<GeometryParameter, Double>> change) {
        return new PlotCase(family, change.apply(new LinkedHashMap<>(dimensions)), variables, fluid);
    }
}
