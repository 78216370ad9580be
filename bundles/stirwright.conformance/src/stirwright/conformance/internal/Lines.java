package stirwright.conformance.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import stirwright.correlation.Bound;
import stirwright.correlation.FluidClass;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.Variable;

/** Cases in which one thing was moved away from a base, in ascending order, as far as no real case may go. */
final class Lines {
    private static final int PER_DECADE = 20;
    private static final int DIMENSION_DECADES = 3;
    private static final int VARIABLE_DECADES = 10;
    private static final int MOST_COUNT = 24;
    private static final double WHERE_ZERO = 0.02;

    private Lines() {}

    /** One line for each thing that a bound reads. */
    static List<List<Situation>> of(Bound bound, Situation base) {
        ReadLog log = new ReadLog(base);
        bound.verdict(log, log);
        List<List<Situation>> lines = new ArrayList<>();
        log.dimensions().forEach(parameter -> lines.add(along(parameter, base)));
        log.variables().forEach(variable -> lines.add(along(variable, base)));
        if (log.fluidRead()) {
            lines.add(fluids(base));
        }
        return lines;
    }

    /** Everything there is moved, one at a time. */
    static List<Situation> all(Situation base) {
        List<Situation> cases = new ArrayList<>(fluids(base));
        base.dimensions().keySet().forEach(parameter -> cases.addAll(along(parameter, base)));
        base.variables().keySet().forEach(variable -> cases.addAll(along(variable, base)));
        return cases;
    }

    private static List<Situation> along(GeometryParameter parameter, Situation base) {
        DoubleStream values = parameter.kind() == GeometryParameter.Kind.COUNT
                ? IntStream.rangeClosed((int) parameter.min(), MOST_COUNT).asDoubleStream()
                : around(base.get(parameter), DIMENSION_DECADES);
        return values.mapToObj(value -> base.with(parameter, value)).toList();
    }

    private static List<Situation> along(Variable variable, Situation base) {
        return around(base.get(variable), VARIABLE_DECADES).mapToObj(value -> base.with(variable, value)).toList();
    }

    private static List<Situation> fluids(Situation base) {
        return Arrays.stream(FluidClass.values()).map(base::with).toList();
    }

    private static DoubleStream around(double value, int decades) {
        double middle = value > 0 ? value : WHERE_ZERO;
        return IntStream.rangeClosed(-decades * PER_DECADE, decades * PER_DECADE)
                .mapToDouble(step -> middle * Math.pow(10, (double) step / PER_DECADE));
    }
}
