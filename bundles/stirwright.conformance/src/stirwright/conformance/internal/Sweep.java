package stirwright.conformance.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import stirwright.correlation.Bound;
import stirwright.correlation.Correlation;
import stirwright.correlation.Variable;

/** Cases from one end of a correlation's stated range to the other, in equal ratios. */
final class Sweep {
    private static final int POINTS = 41;

    /** Where a source leaves an end of the Reynolds number open. */
    private static final double LEAST_REYNOLDS = 1e-2;
    private static final double MOST_REYNOLDS = 1e7;

    /** Where it leaves an end of another variable open, that far from the base. */
    private static final double OPEN_FACTOR = 100;

    private record Span(double least, double most) {

        DoubleStream points() {
            return IntStream.range(0, POINTS).mapToDouble(i -> i == POINTS - 1 ? most
                    : least * Math.pow(most / least, (double) i / (POINTS - 1)));
        }
    }

    private Sweep() {}

    /** Each variable on its own, and the ends of all together. */
    static List<Situation> of(Correlation correlation, Situation base) {
        List<Situation> cases = new ArrayList<>();
        List<Situation> corners = List.of(base);
        for (Map.Entry<Variable, Span> each : spans(correlation, base).entrySet()) {
            Variable variable = each.getKey();
            Span span = each.getValue();
            span.points().forEach(value -> cases.add(base.with(variable, value)));
            corners = corners.stream().flatMap(corner -> DoubleStream.of(span.least, span.most)
                    .mapToObj(end -> corner.with(variable, end))).toList();
        }
        cases.addAll(corners);
        return cases;
    }

    private static Map<Variable, Span> spans(Correlation correlation, Situation base) {
        Map<Variable, Span> spans = new LinkedHashMap<>();
        if (correlation.reads().contains(Variable.REYNOLDS)) {
            spans.put(Variable.REYNOLDS, new Span(LEAST_REYNOLDS, MOST_REYNOLDS));
        }
        for (Bound bound : correlation.validity()) {
            if (bound instanceof Bound.Range range) {
                range.subject().variable().ifPresent(variable -> spans.put(variable, span(variable, range, base)));
            }
        }
        return spans;
    }

    private static Span span(Variable variable, Bound.Range range, Situation base) {
        boolean reynolds = variable.equals(Variable.REYNOLDS);
        double value = base.get(variable);
        return new Span(
                range.least() > 0 ? range.least() : reynolds ? LEAST_REYNOLDS : value / OPEN_FACTOR,
                range.most() < Double.POSITIVE_INFINITY ? range.most() : reynolds ? MOST_REYNOLDS : value * OPEN_FACTOR);
    }
}
