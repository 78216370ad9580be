package stirwright.conformance.internal;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.stream.DoubleStream;
import stirwright.correlation.Bound;
import stirwright.correlation.Correlation;
import stirwright.correlation.Variable;

/** A range of a variable to sweep, both ends above zero and finite. */
record Span(double least, double most) {

    /** Stands in for an open end. */
    private static final Map<Variable, Span> WHERE_OPEN = Map.of(
            Variable.REYNOLDS, new Span(1e-2, 1e7), Variable.FLOW_INDEX, new Span(0.1, 1.5));

    private static final double OPEN_FACTOR = 100;

    /**
     * The variables to sweep: the Reynolds number always, others where the correlation states a
     * range for them.
     */
    static Map<Variable, Span> statedBy(Correlation correlation, Situation situation) {
        Map<Variable, Span> spans = new LinkedHashMap<>();
        spans.put(Variable.REYNOLDS, WHERE_OPEN.get(Variable.REYNOLDS));
        for (Bound bound : correlation.validity()) {
            if (bound instanceof Bound.Range range) {
                variable(range, situation).ifPresent(v -> spans.put(v, of(v, range)));
            }
        }
        return spans;
    }

    /** The variable that a range is about, if it is about a variable itself. */
    private static Optional<Variable> variable(Bound.Range range, Situation situation) {
        ReadLog log = new ReadLog(situation);
        range.subject().value(log, log);
        return log.dimensions().isEmpty() && log.variables().size() == 1
                ? log.variables().stream().filter(v -> isItself(range, situation, v)).findFirst()
                : Optional.empty();
    }

    private static boolean isItself(Bound.Range range, Situation situation, Variable variable) {
        return DoubleStream.of(0.3, 7).allMatch(value -> {
            Situation there = situation.with(variable, value);
            return range.subject().value(there, there) == value;
        });
    }

    private static Span of(Variable variable, Bound.Range range) {
        Span open = WHERE_OPEN.getOrDefault(variable, new Span(0, Double.POSITIVE_INFINITY));
        double least = Math.max(range.least(), open.least);
        double most = Math.min(range.most(), open.most);
        if (!(most > 0 && most < Double.POSITIVE_INFINITY) || most < least) {
            most = (least > 0 ? least : 1) * OPEN_FACTOR;
        }
        if (!(least > 0) || least > most) {
            least = most / OPEN_FACTOR;
        }
        return new Span(least, most);
    }

    /** From the least at 0 to the most at 1, in equal ratios; the ends exactly. */
    double at(double share) {
        return share == 0 ? least : share == 1 ? most : least * Math.pow(most / least, share);
    }

    DoubleStream ends() {
        return DoubleStream.of(least, most);
    }
}
