package stirwright.conformance.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import stirwright.correlation.Bound;
import stirwright.correlation.Correlation;

/**
 * The cases on which a correlation is tried; each sets out from a reference row.
 *
 * @param bases the rows within all stated bounds
 * @param inside cases within them around these: each class and count that is allowed, and from end to end
 * @param probes everything that these and the other rows lead to, also beyond the bounds
 */
record Trials(List<Situation> bases, List<Situation> inside, List<Situation> probes) {

    static Trials of(Correlation correlation, List<ReferenceRow> rows) {
        List<Situation> bases = new ArrayList<>();
        List<Situation> inside = new ArrayList<>();
        for (ReferenceRow row : rows) {
            if (row.within()) {
                bases.add(row.situation());
                around(row).filter(situation -> situation.existsIn(row.family())
                        && ReferenceRow.obstacle(correlation, situation).isEmpty()).forEach(inside::add);
            }
        }
        List<Situation> probes = new ArrayList<>(inside);
        rows.forEach(row -> probes.addAll(Lines.all(row.situation())));
        return new Trials(bases, inside, probes);
    }

    private static Stream<Situation> around(ReferenceRow row) {
        Stream<Situation> moved = row.correlation().validity().stream().filter(bound -> !isSwept(bound))
                .flatMap(bound -> Lines.of(bound, row.situation()).stream()).flatMap(List::stream);
        return Stream.concat(Stream.concat(Stream.of(row.situation()), moved),
                Sweep.of(row.correlation(), row.situation()).stream());
    }

    private static boolean isSwept(Bound bound) {
        return bound instanceof Bound.Range range && range.subject().variable().isPresent();
    }
}
