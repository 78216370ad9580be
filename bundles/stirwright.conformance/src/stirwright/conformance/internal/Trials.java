package stirwright.conformance.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import stirwright.correlation.Bound;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;

/**
 * The cases on which a correlation is tried.
 *
 * @param bases one case within all stated bounds for each family that has one
 * @param inside a sweep over the stated range, all of it within the bounds
 * @param probes the sweep, the reference rows, and cases around them that may be out of bounds
 * @param obstacle why there is no base; empty when there is one
 */
record Trials(List<Situation> bases, List<Situation> inside, List<Situation> probes, String obstacle) {

    static Trials of(Correlation correlation, Workpiece workpiece) {
        Distance distance = Distance.to(correlation);
        List<Situation> bases = new ArrayList<>();
        List<Situation> inside = new ArrayList<>();
        List<Situation> probes = new ArrayList<>();
        List<String> obstacles = new ArrayList<>();
        for (Family family : families(correlation, workpiece)) {
            Optional<Draft> nearest = new SituationSearch(distance).from(Draft.standard(family, correlation.reads()));
            Optional<Situation> situation = nearest.flatMap(Draft::situation);
            if (situation.isEmpty()) {
                obstacles.add("family " + family.id() + " allows no ordinary geometry");
            } else if (!distance.within(situation.get())) {
                obstacles.add("in family " + family.id() + " no case was found within all of its bounds: "
                        + nearestMiss(distance, situation.get()));
            } else if (known(correlation, family, situation.get())) {
                bases.add(situation.get());
                Sweep sweep = new Sweep(correlation, distance);
                Alternatives.of(distance, nearest.get()).forEach(s -> inside.addAll(sweep.over(s)));
                probes.addAll(Surroundings.of(correlation, situation.get()));
            }
        }
        probes.addAll(inside);
        workpiece.references().of(correlation).forEach(row -> {
            probes.addAll(Surroundings.of(correlation, row.situation()));
        });
        String obstacle = bases.isEmpty() ? String.join("; ", obstacles) : "";
        return new Trials(bases, inside, probes,
                bases.isEmpty() && obstacle.isEmpty() ? "there is no family to try it on" : obstacle);
    }

    private static List<Family> families(Correlation correlation, Workpiece workpiece) {
        if (!correlation.families().isEmpty()) {
            return correlation.families().stream().flatMap(id -> workpiece.family(id).stream()).toList();
        }
        List<Family> families = new ArrayList<>(workpiece.families());
        families.add(StandardCase.anyFamily());
        return families;
    }

    /** A relation for any family may need a dimension that this one does not have; then it says nothing here. */
    private static boolean known(Correlation correlation, Family family, Situation situation) {
        ReadLog log = new ReadLog(situation);
        Outcome.of(correlation, log, log);
        return !correlation.families().isEmpty()
                || log.dimensions().stream().allMatch(p -> family.parameter(p.id()).isPresent());
    }

    private static String nearestMiss(Distance distance, Situation situation) {
        List<Bound> failing = distance.failing(situation);
        return failing.isEmpty()
                ? "it applies when " + distance.correlation().appliesWhen()
                : failing.get(0).words() + ", found " + failing.get(0).found(situation, situation);
    }
}
