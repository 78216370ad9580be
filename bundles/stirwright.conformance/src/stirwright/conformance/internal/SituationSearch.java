package stirwright.conformance.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import stirwright.correlation.Bound;
import stirwright.correlation.Dimensions;
import stirwright.correlation.FluidClass;
import stirwright.correlation.Measure;

/**
 * Looks for a case within the stated bounds of a correlation: changes, one at a time, what the
 * failing bounds read. Greedy, so it may miss a case that only a change of two things at once finds.
 */
final class SituationSearch {
    private static final int MOST_STEPS = 16;

    private final Distance distance;

    SituationSearch(Distance distance) {
        this.distance = distance;
    }

    /** The nearest draft found; its situation may still fail some bound. Empty when the start is no case. */
    Optional<Draft> from(Draft start) {
        Draft best = start;
        double least = cost(start);
        for (int step = 0; step < MOST_STEPS && least > 0 && least < Double.MAX_VALUE; step++) {
            Draft before = best;
            for (Draft draft : neighbours(before)) {
                double cost = cost(draft);
                if (cost < least) {
                    best = draft;
                    least = cost;
                }
            }
            if (best == before) {
                break;
            }
        }
        return least == Double.MAX_VALUE ? Optional.empty() : Optional.of(best);
    }

    private double cost(Draft draft) {
        return draft.situation().map(distance::of).orElse(Double.MAX_VALUE);
    }

    private List<Draft> neighbours(Draft draft) {
        Situation situation = draft.situation().orElseThrow();
        List<Bound> failing = distance.failing(situation);
        ReadLog log = new ReadLog(situation);
        failing.forEach(bound -> bound.verdict(log, log));
        distance.correlation().appliesTo(log);
        double[] factors = failing.stream().flatMap(b -> factors(b, situation)).mapToDouble(d -> d).toArray();
        List<Draft> neighbours = new ArrayList<>();
        log.get(Dimensions.IMPELLER_DIAMETER);
        log.dimensions().stream().filter(p -> draft.family().parameter(p.id()).isPresent()).forEach(parameter ->
                Steps.of(parameter.kind(), situation.get(parameter), factors)
                        .forEach(value -> neighbours.add(draft.with(parameter, value))));
        log.variables().forEach(variable -> Steps.ofNumber(situation.get(variable), factors)
                .forEach(value -> neighbours.add(draft.with(variable, value))));
        if (log.fluidRead()) {
            Arrays.stream(FluidClass.values()).forEach(fluid -> neighbours.add(draft.with(fluid)));
        }
        return neighbours;
    }

    /** What a measure would have to be multiplied with to come to its ends or between them. */
    private static Stream<Double> factors(Bound bound, Situation situation) {
        return switch (bound) {
            case Bound.Range range -> ratios(range.subject(), situation,
                    range.least(), range.most(), Math.sqrt(range.least() * range.most()),
                    (range.least() + range.most()) / 2);
            case Bound.OneOf set -> ratios(set.subject(), situation,
                    set.allowed().stream().mapToDouble(d -> d).toArray());
            case Bound.InClass set -> Stream.empty();
            case Bound.NotStated silent -> Stream.empty();
        };
    }

    private static Stream<Double> ratios(Measure measure, Situation situation, double... targets) {
        double value = measure.value(situation, situation);
        return Arrays.stream(targets).map(target -> target / value)
                .filter(factor -> factor > 0 && Double.isFinite(factor)).boxed();
    }
}
