package stirwright.conformance.internal;

import java.util.List;
import stirwright.correlation.Correlation;
import stirwright.correlation.Figures;
import stirwright.correlation.Variable;

/** Whether a correlation gives usable numbers where it says that it holds. */
public final class StatedRange {

    private StatedRange() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        for (Correlation correlation : workpiece.offer().correlations()) {
            Trials trials = workpiece.trials(correlation);
            if (!trials.obstacle().isEmpty()) {
                findings.add(correlation.id(), "cannot be tried within its stated bounds: " + trials.obstacle());
            }
            trials.inside().stream().filter(s -> !usable(correlation, s)).findFirst()
                    .ifPresent(s -> findings.add(correlation.id(), "within its stated bounds it "
                            + words(Outcome.of(correlation, s)) + where(correlation, s)));
            // Beyond the bounds NaN is an answer, an exception never is.
            trials.probes().stream().filter(s -> !Outcome.of(correlation, s).failure().isEmpty()).findFirst()
                    .filter(s -> trials.inside().stream().allMatch(i -> usable(correlation, i)))
                    .ifPresent(s -> findings.add(correlation.id(), "beyond its stated bounds it "
                            + words(Outcome.of(correlation, s)) + where(correlation, s) + "; NaN would do"));
        }
    }

    private static boolean usable(Correlation correlation, Situation situation) {
        Outcome outcome = Outcome.of(correlation, situation);
        return outcome.finite() && outcome.value() > 0;
    }

    private static String words(Outcome outcome) {
        return outcome.failure().isEmpty() ? "gives " + Figures.show(outcome.value()) : "throws " + outcome.failure();
    }

    private static String where(Correlation correlation, Situation situation) {
        List<String> values = correlation.reads().stream().map((Variable v) ->
                v.title() + " " + Figures.show(situation.get(v))).toList();
        return values.isEmpty() ? " whatever the state" : " at " + String.join(", ", values);
    }
}
