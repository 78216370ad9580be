package stirwright.conformance.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import stirwright.correlation.Bound;

/** Cases within the bounds that differ: each allowed class and count, each end of each range. */
final class Alternatives {

    /** How near to an end of a range counts as at the end, as a share of the range. */
    private static final double AT_END = 0.05;

    private Alternatives() {}

    /** The case itself first. */
    static List<Situation> of(Distance distance, Draft within) {
        List<Situation> situations = new ArrayList<>();
        within.situation().ifPresent(situations::add);
        distance.bounds().stream().flatMap(Alternatives::narrower).forEach(bound -> {
            Distance narrowed = distance.narrowed(bound);
            new SituationSearch(narrowed).from(within).flatMap(Draft::situation)
                    .filter(narrowed::within).ifPresent(situations::add);
        });
        return situations;
    }

    private static Stream<Bound> narrower(Bound bound) {
        return switch (bound) {
            case Bound.OneOf set -> set.allowed().stream().map(a -> new Bound.OneOf(set.subject(), List.of(a)));
            case Bound.InClass set -> set.allowed().stream().map(a -> new Bound.InClass(set.subject(), List.of(a)));
            case Bound.Range range -> ends(range);
            case Bound.NotStated silent -> Stream.empty();
        };
    }

    private static Stream<Bound> ends(Bound.Range range) {
        boolean closed = Double.isFinite(range.least()) && Double.isFinite(range.most());
        double width = closed ? range.most() - range.least()
                : Math.abs(Double.isFinite(range.least()) ? range.least() : range.most());
        double margin = AT_END * width;
        Stream.Builder<Bound> ends = Stream.builder();
        if (Double.isFinite(range.least())) {
            ends.add(new Bound.Range(range.subject(), range.least(), range.least() + margin, ""));
        }
        if (Double.isFinite(range.most())) {
            ends.add(new Bound.Range(range.subject(), range.most() - margin, range.most(), ""));
        }
        return ends.build();
    }
}
