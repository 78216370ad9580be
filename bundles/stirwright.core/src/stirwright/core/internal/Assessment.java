package stirwright.core.internal;

import java.util.ArrayList;
import java.util.List;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.correlation.Bound;
import stirwright.correlation.Term;
import stirwright.correlation.Variable;
import stirwright.correlation.Verdict;

/**
 * How a candidate stands to its bounds at one state, and whether it qualifies. The words are found
 * when they are asked for, since most assessments are made on the way to a solution.
 */
final class Assessment {
    private final Verdict verdict;
    private final double distance;
    private final List<Failure> failures;
    private final String problem;
    private List<String> failed;

    /** A stated bound that the case fails, and all that it takes to say so. */
    private record Failure(
            Candidate candidate, Candidate.Part part, Bound bound, Verdict verdict, Point point, double reynolds,
            double distance) {
        String words() {
            point.set(Variable.REYNOLDS, reynolds);
            String whose = part == candidate.parts().get(0) ? "" : part.correlation().id() + ": ";
            String found = candidate.foreign().call(
                    () -> bound.found(candidate.geometry(), point), bound.subject().title());
            return found + (verdict == Verdict.NEAR ? " is just outside (" : " is outside (") + whose + bound.allowance() + ")";
        }
    }

    private Assessment(Verdict verdict, double distance, List<Failure> failures, String problem) {
        this.verdict = verdict;
        this.distance = distance;
        this.failures = failures;
        this.problem = problem;
    }

    /** Of a candidate for which no state was found. */
    static Assessment impossible(String reason) {
        return new Assessment(Verdict.NOT_STATED, Double.POSITIVE_INFINITY, List.of(), reason);
    }

    /** @param point holds the state and belongs to this assessment from now on */
    static Assessment of(Candidate candidate, Point point, FluidState state, double value) {
        if (candidate.correlation().isEmpty()) {
            return new Assessment(Verdict.NOT_STATED, 0, List.of(), "");
        }
        String unknown = unknown(candidate, point, state);
        Findings findings = candidate.foreign().call(() -> findings(candidate, point, state), Findings.UNKNOWN);
        return new Assessment(findings.worst(), findings.distance(), findings.failures(),
                problem(candidate, value, unknown, findings.failures().isEmpty()));
    }

    /** What a look at every bound finds. */
    private record Findings(Verdict worst, double distance, List<Failure> failures) {
        /** Where the bounds' own code fails. */
        static final Findings UNKNOWN = new Findings(Verdict.OUTSIDE, Double.POSITIVE_INFINITY, List.of());
    }

    private static Findings findings(Candidate candidate, Point point, FluidState state) {
        Verdict worst = Verdict.INSIDE;
        double distance = 0;
        List<Failure> failures = List.of();
        for (Candidate.Part part : candidate.parts()) {
            double reynolds = part.reynolds(state, state.reynolds());
            point.set(Variable.REYNOLDS, reynolds);
            for (Bound bound : part.correlation().validity()) {
                Verdict found = bound.verdict(candidate.geometry(), point);
                worst = worst.worseOf(found);
                if (found.fails()) {
                    double beyond = distance(bound, candidate, point);
                    distance += beyond;
                    failures = failures.isEmpty() ? new ArrayList<>() : failures;
                    failures.add(new Failure(candidate, part, bound, found, point, reynolds, beyond));
                }
            }
        }
        return new Findings(worst, distance, failures);
    }

    /** The logarithm of the ratio to the bound; infinite for a class or a count. */
    private static double distance(Bound bound, Candidate candidate, Point point) {
        if (bound instanceof Bound.Range range) {
            double value = range.subject().value(candidate.geometry(), point);
            double ratio = value < range.least() ? range.least() / value : value / range.most();
            return ratio > 0 ? Math.log(ratio) : Double.POSITIVE_INFINITY;
        }
        return Double.POSITIVE_INFINITY;
    }

    /** What stands in its way apart from bounds; what no case can mend counts only where none fails. */
    private static String problem(Candidate candidate, double value, String unknown, boolean withinBounds) {
        if (!candidate.foreign().failure().isEmpty()) {
            return "its code fails: " + candidate.foreign().failure();
        }
        if (!unknown.isEmpty()) {
            return unknown;
        }
        if (!(value > 0 && value < Double.POSITIVE_INFINITY)) {
            return "its formula gives no positive number here";
        }
        return withinBounds ? candidate.distrust() : "";
    }

    /** What it reads and nobody knows here, in words; empty when all is known. */
    static String unknown(Candidate candidate, Point point, FluidState state) {
        for (Candidate.Part part : candidate.parts()) {
            if (Double.isNaN(part.reynolds(state, state.reynolds()))) {
                return "its Reynolds number (" + part.correlation().reynoldsDefinition().title()
                        + ") cannot be computed here";
            }
        }
        Variable unknown = candidate.unknownAt(point);
        return unknown == null ? "" : "it needs the " + unknown.title() + ", which is not known here";
    }

    /** The worst over all bounds, those of the applied modifiers included. */
    Verdict verdict() {
        return verdict;
    }

    /** Whether a stated bound of the correlation itself on this measure or classifier fails. */
    boolean fails(Term subject) {
        return failures.stream().anyMatch(f -> f.bound().subject().equals(subject)
                && f.part() == f.candidate().parts().get(0));
    }

    /** How far beyond its bounds the case lies: the sum over those that fail. */
    double distance() {
        return distance;
    }

    int failureCount() {
        return failures.size();
    }

    boolean qualifies() {
        return failures.isEmpty() && problem.isEmpty();
    }

    /** Each stated bound that fails, with what the case has. */
    List<String> failed() {
        if (failed == null) {
            failed = failures.stream().map(Failure::words).toList();
        }
        return failed;
    }

    /** Why it does not qualify, in one sentence; empty when it does. */
    String obstacle() {
        if (!problem.isEmpty() || failures.isEmpty()) {
            return problem;
        }
        return failed().get(worst()) + (failures.size() > 1 ? " (and " + (failures.size() - 1) + " more)" : "");
    }

    /** The failure that lies furthest out; of equal ones the first. */
    private int worst() {
        int worst = 0;
        for (int i = 1; i < failures.size(); i++) {
            worst = failures.get(i).distance() > failures.get(worst).distance() ? i : worst;
        }
        return worst;
    }
}
