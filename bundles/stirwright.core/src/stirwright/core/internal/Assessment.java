package stirwright.core.internal;

import java.util.ArrayList;
import java.util.List;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.correlation.Bound;
import stirwright.correlation.Variable;
import stirwright.correlation.Verdict;

/**
 * How a candidate stands to its bounds at one state, and whether it qualifies.
 *
 * @param verdict the worst over all bounds, those of the applied modifiers included
 * @param failed each stated bound that fails, with what the case has
 * @param distance how far beyond its stated bounds the case lies: the sum of the logarithms of the
 *     ratios, infinite when a class or count fails
 * @param obstacle why it does not qualify, in one sentence; empty when it does
 */
record Assessment(Verdict verdict, List<String> failed, double distance, String obstacle) {

    boolean qualifies() {
        return obstacle.isEmpty();
    }

    /** Of a candidate for which no state was found. */
    static Assessment impossible(String reason) {
        return new Assessment(Verdict.NOT_STATED, List.of(), Double.POSITIVE_INFINITY, reason);
    }

    static Assessment of(Candidate candidate, Point point, FluidState state, double value) {
        if (candidate.correlation().isEmpty()) {
            return new Assessment(Verdict.NOT_STATED, List.of(), 0, "");
        }
        Verdict verdict = candidate.verdict(point, state, state.reynolds());
        List<String> failed = new ArrayList<>();
        double distance = verdict.fails() && candidate.failure().isEmpty()
                ? collectFailures(candidate, point, state, failed) : 0;
        return new Assessment(verdict, List.copyOf(failed), distance, obstacle(candidate, value, failed, point, state));
    }

    private static double collectFailures(Candidate candidate, Point point, FluidState state, List<String> failed) {
        double distance = 0;
        for (Candidate.Part part : candidate.parts()) {
            point.set(Variable.REYNOLDS, part.reynolds(state, state.reynolds()));
            String whose = part == candidate.parts().get(0) ? "" : part.correlation().id() + ": ";
            for (Bound bound : part.correlation().validity()) {
                Verdict found = bound.verdict(candidate.geometry(), point);
                if (found.fails()) {
                    failed.add(bound.found(candidate.geometry(), point) + " is " + found.id()
                            + " (" + whose + bound.allowance() + ")");
                    distance += distance(bound, candidate, point);
                }
            }
        }
        return distance;
    }

    private static double distance(Bound bound, Candidate candidate, Point point) {
        if (bound instanceof Bound.Range range) {
            double value = range.subject().value(candidate.geometry(), point);
            double ratio = value < range.least() ? range.least() / value : value / range.most();
            return ratio > 0 ? Math.log(ratio) : Double.POSITIVE_INFINITY;
        }
        return Double.POSITIVE_INFINITY;
    }

    private static String obstacle(
            Candidate candidate, double value, List<String> failed, Point point, FluidState state) {
        String unknown = unknown(candidate, point, state);
        if (!candidate.failure().isEmpty()) {
            return "its code fails: " + candidate.failure();
        }
        if (!unknown.isEmpty()) {
            return unknown;
        }
        if (!(value > 0 && value < Double.POSITIVE_INFINITY)) {
            return "its formula gives no positive number here";
        }
        if (!failed.isEmpty()) {
            return failed.get(0) + (failed.size() > 1 ? " (and " + (failed.size() - 1) + " more)" : "");
        }
        return Trust.obstacle(candidate);
    }

    /** What it reads and nobody knows here, in words; empty when all is known. */
    static String unknown(Candidate candidate, Point point, FluidState state) {
        for (Candidate.Part part : candidate.parts()) {
            if (Double.isNaN(part.reynolds(state, state.reynolds()))) {
                return "its Reynolds number (" + part.correlation().reynoldsDefinition().title()
                        + ") cannot be computed here";
            }
        }
        for (Variable variable : candidate.reads()) {
            if (!variable.equals(Variable.REYNOLDS) && Double.isNaN(point.get(variable))) {
                return "it needs the " + variable.title() + ", which is not known here";
            }
        }
        return "";
    }
}
