package stirwright.conformance.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.DoubleStream;
import stirwright.correlation.Correlation;
import stirwright.correlation.FluidClass;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.Variable;

/**
 * Cases around one: each dimension, count and variable moved on its own, a little and far, so that
 * every term of a formula shows.
 */
final class Surroundings {
    private static final double[] VARIABLE_FACTORS = {1e-3, 0.1, 0.5, 1.1, 10, 1e3};
    private static final double[] DIMENSION_FACTORS = {0.25, 1.1, 4};
    private static final double WHERE_ZERO = 0.05;

    private Surroundings() {}

    static List<Situation> of(Correlation correlation, Situation situation) {
        List<Situation> around = new ArrayList<>(List.of(situation));
        for (Variable variable : correlation.reads()) {
            for (double factor : VARIABLE_FACTORS) {
                around.add(situation.with(variable, factor * situation.get(variable)));
            }
        }
        for (FluidClass fluid : FluidClass.values()) {
            around.add(situation.with(fluid));
        }
        for (Situation state : List.copyOf(around)) {
            situation.dimensions().forEach((parameter, value) -> moved(parameter, value)
                    .forEach(other -> around.add(state.with(parameter, other))));
        }
        return around;
    }

    private static DoubleStream moved(GeometryParameter parameter, double value) {
        if (parameter.kind() == GeometryParameter.Kind.COUNT) {
            return DoubleStream.of(value + 1, 4 * value);
        }
        double base = value == 0 ? WHERE_ZERO : value;
        return DoubleStream.of(DIMENSION_FACTORS).map(factor -> factor * base);
    }
}
