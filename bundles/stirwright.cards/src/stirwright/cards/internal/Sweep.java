package stirwright.cards.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.BiFunction;
import java.util.function.ToDoubleFunction;
import stirwright.correlation.Bound;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.GeometryParameter.Kind;
import stirwright.correlation.Measure;
import stirwright.correlation.Variable;

/**
 * What a plot runs over.
 *
 * @param variable that is swept; null for a dimension
 * @param dimension that is swept; null for a variable
 * @param title of the axis, with the unit
 * @param note what moves along with it; blank for nothing
 * @param least and {@code most}: as far as it is tried
 * @param move gives a case another value
 * @param read the value that a case has
 */
record Sweep(Variable variable, GeometryParameter dimension, String title, String note, boolean logarithmic, boolean whole,
        double least, double most, BiFunction<PlotCase, Double, PlotCase> move, ToDoubleFunction<PlotCase> read) {

    private static final double LEAST_REYNOLDS = 0.1;
    private static final double MOST_REYNOLDS = 1e6;
    private static final double DECADE = 10;
    private static final double DIMENSION = 3;
    private static final double LEAST_RATIO = 0.05;
    private static final double MOST_RATIO = 0.98;
    private static final int MOST_COUNT = 12;
    private static final double LEAST_ANGLE = 10;
    private static final double RIGHT_ANGLE = 90;
    private static final Set<GeometryParameter> BY_VESSEL =
            Set.of(Dimensions.LIQUID_HEIGHT, Dimensions.BAFFLE_WIDTH, Dimensions.CLEARANCE);

    /** Whether regimes can be marked. */
    boolean reynolds() {
        return Variable.REYNOLDS.equals(variable);
    }

    /** Over the Reynolds number, by a decade beyond what a source states. */
    static Sweep reynolds(Correlation card) {
        double least = LEAST_REYNOLDS;
        double most = MOST_REYNOLDS;
        if (card.bound(Measure.REYNOLDS).orElse(null) instanceof Bound.Range range) {
            least = range.least() > 0 ? Math.min(least, range.least() / DECADE) : least;
            most = range.most() < Double.POSITIVE_INFINITY ? Math.max(most, range.most() * DECADE) : most;
        }
        return over(Variable.REYNOLDS, true, least, most);
    }

    /** Over any variable; empty where the case has no value of it to start from. */
    static Optional<Sweep> over(Correlation card, Variable variable, PlotCase base) {
        if (variable.equals(Variable.REYNOLDS)) {
            return Optional.of(reynolds(card));
        }
        double value = base.get(variable);
        if (!(value > 0)) {
            return Optional.empty();
        }
        return Optional.of(variable.equals(Variable.FLOW_INDEX) ? over(variable, false, LEAST_RATIO, 2)
                : over(variable, true, value / DECADE, value * DECADE));
    }

    private static Sweep over(Variable variable, boolean logarithmic, double least, double most) {
        String unit = variable.unit().equals("-") ? "" : ", in " + variable.unit();
        return new Sweep(variable, null, variable.title() + ", " + variable.symbol() + unit, "", logarithmic, false,
                least, most, (c, x) -> c.with(variable, x), c -> c.get(variable));
    }

    /** Over each dimension that a formula read, where it can be moved. */
    static List<Sweep> over(Correlation card, Set<GeometryParameter> read, PlotCase base) {
        List<Sweep> sweeps = new ArrayList<>();
        for (GeometryParameter parameter : read) {
            // The gap and the vessel move together, and the gap is what is read of them.
            boolean told = parameter.equals(Dimensions.VESSEL_DIAMETER) && read.contains(Dimensions.WALL_GAP);
            if (base.get(parameter) > 0 && !told) {
                over(card, parameter, base).ifPresent(sweeps::add);
            }
        }
        return sweeps;
    }

    private static Optional<Sweep> over(Correlation card, GeometryParameter parameter, PlotCase base) {
        if (parameter.equals(Dimensions.VESSEL_DIAMETER)) {
            return Optional.of(new Sweep(null, parameter, "impeller over vessel diameter, D/T", "H/T, C/T and B/T stay.", false, false,
                    LEAST_RATIO, MOST_RATIO, (c, x) -> c.inVessel(c.get(Dimensions.IMPELLER_DIAMETER) / x),
                    c -> c.ratio(Dimensions.IMPELLER_DIAMETER, Dimensions.VESSEL_DIAMETER)));
        }
        if (parameter.equals(Dimensions.WALL_GAP)) {
            double[] reach = reach(card, Measure.ratio(parameter, Dimensions.IMPELLER_DIAMETER), base);
            return Optional.of(new Sweep(null, parameter, "wall gap over impeller diameter, c/D", "H/T, C/T and B/T stay.", false, false,
                    reach[0], reach[1], (c, x) -> c.inVessel(c.get(Dimensions.IMPELLER_DIAMETER) * (1 + 2 * x)),
                    c -> c.ratio(Dimensions.WALL_GAP, Dimensions.IMPELLER_DIAMETER)));
        }
        Kind kind = parameter.kind();
        if (kind == Kind.LENGTH && !parameter.equals(Dimensions.IMPELLER_DIAMETER)) {
            GeometryParameter by = BY_VESSEL.contains(parameter) ? Dimensions.VESSEL_DIAMETER : Dimensions.IMPELLER_DIAMETER;
            double[] reach = reach(card, Measure.ratio(parameter, by), base);
            return Optional.of(alone(parameter, parameter.title() + " over " + by.title() + ", " + parameter.symbol() + "/" + by.symbol(),
                    false, reach[0], reach[1], base.get(by)));
        }
        if (kind == Kind.ANGLE) {
            return Optional.of(alone(parameter, parameter.title() + ", in degrees", false, LEAST_ANGLE, RIGHT_ANGLE,
                    parameter.fromColumn(1)));
        }
        double value = base.get(parameter);
        return switch (kind) {
            case COUNT -> Optional.of(alone(parameter, parameter.title() + ", " + parameter.symbol(), true,
                    Math.max(1, parameter.min()), Math.min(Math.max(MOST_COUNT, value), parameter.max()), 1));
            case RATIO -> {
                double[] reach = reach(card, Measure.of(parameter), base);
                yield Optional.of(alone(parameter, parameter.title() + ", " + parameter.symbol(), false, reach[0], reach[1], 1));
            }
            default -> Optional.empty();
        };
    }

    /** Around the base and as far as the source states, with room beyond. */
    private static double[] reach(Correlation card, Measure measure, PlotCase base) {
        double value = measure.value(base, base);
        double[] reach = {value / DIMENSION, value * DIMENSION};
        if (card.bound(measure).orElse(null) instanceof Bound.Range range) {
            reach[0] = range.least() > 0 ? Math.min(reach[0], range.least() / 2) : reach[0];
            reach[1] = range.most() < Double.POSITIVE_INFINITY ? Math.max(reach[1], range.most() * 2) : reach[1];
        }
        return reach;
    }

    private static Sweep alone(GeometryParameter parameter, String title, boolean whole, double least, double most, double unit) {
        return new Sweep(null, parameter, title, "", false, whole, least, most, (c, x) -> c.with(parameter, x * unit),
                c -> c.get(parameter) / unit);
    }
}
