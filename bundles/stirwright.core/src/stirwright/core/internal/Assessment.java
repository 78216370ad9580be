package stirwright.core.internal;

import java.util.ArrayList;
import java.util.List;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.correlation.Bound;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.Measure;
import stirwright.correlation.Term;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;
import stirwright.correlation.Verdict;

/**
 * How a candidate stands to its bounds at one state, and whether it qualifies.
 *
 * @param verdict the worst over all bounds, those of the applied modifiers included
 * @param failed each stated bound that fails, with what the case has
 * @param obstacle why it does not qualify, in one sentence; empty when it does
 */
record Assessment(Verdict verdict, List<String> failed, int notStated, String obstacle) {

    boolean qualifies() {
        return obstacle.isEmpty();
    }

    /** Of a candidate for which no state was found. */
    static Assessment impossible(String reason) {
        return new Assessment(Verdict.NOT_STATED, List.of(), 0, reason);
    }

    static Assessment of(Candidate candidate, Point point, FluidState state, double value) {
        if (candidate.correlation().isEmpty()) {
            return new Assessment(Verdict.NOT_STATED, List.of(), 0, "");
        }
        Correlation correlation = candidate.correlation().get();
        Verdict verdict = Verdict.INSIDE;
        List<String> failed = new ArrayList<>();
        int notStated = 0;
        List<Correlation> all = new ArrayList<>(candidate.modifiers());
        all.add(0, correlation);
        for (Correlation part : all) {
            point.set(Variable.REYNOLDS, state.reynolds(part.reynoldsDefinition()));
            for (Bound bound : part.validity()) {
                Verdict found = bound.verdict(candidate.geometry(), point);
                verdict = verdict.worseOf(found);
                if (found.fails()) {
                    failed.add(bound.found(candidate.geometry(), point) + " is " + found.id() + " ("
                            + (part == correlation ? "" : part.id() + ": ") + bound.allowance() + ")");
                } else if (found == Verdict.NOT_STATED && part == correlation) {
                    notStated++;
                }
            }
        }
        String obstacle = obstacle(correlation, value, failed, point, state);
        return new Assessment(verdict, List.copyOf(failed), notStated, obstacle);
    }

    private static String obstacle(
            Correlation correlation, double value, List<String> failed, Point point, FluidState state) {
        if (Double.isNaN(state.reynolds(correlation.reynoldsDefinition()))) {
            return "its Reynolds number (" + correlation.reynoldsDefinition().title() + ") cannot be computed here";
        }
        for (Variable variable : correlation.reads()) {
            if (Double.isNaN(point.get(variable))) {
                return "it needs the " + variable.title() + ", which is not known here";
            }
        }
        if (!(value > 0 && value < Double.POSITIVE_INFINITY)) {
            return "its formula gives no positive number here";
        }
        if (!failed.isEmpty()) {
            return failed.get(0) + (failed.size() > 1 ? " (and " + (failed.size() - 1) + " more)" : "");
        }
        if (!stated(correlation, Measure.REYNOLDS)) {
            return "its source states no range of the Reynolds number";
        }
        if (!statesGeometryClass(correlation)) {
            return "its source does not state the impeller type or whether the vessel was baffled";
        }
        if (correlation.transcription() == Transcription.UNSURE) {
            return "some of its digits are unsure (" + correlation.transcription().words() + ")";
        }
        if (!correlation.citation().hasSource()) {
            return "it has no source (common practice)";
        }
        return correlation.standing().recommendable()
                ? "" : "its standing is " + correlation.standing().words();
    }

    /** Blade count or type, and baffled or not. A relation made for named families states the type. */
    private static boolean statesGeometryClass(Correlation correlation) {
        boolean type = !correlation.families().isEmpty() || stated(correlation, Measure.BLADE_COUNT);
        return type && stated(correlation, Classifier.BAFFLING);
    }

    private static boolean stated(Correlation correlation, Term subject) {
        return correlation.bound(subject).map(Bound::stated).orElse(false);
    }
}
