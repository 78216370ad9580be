package stirwright.conformance.internal;

import java.util.List;
import java.util.Optional;
import stirwright.correlation.Correlation;
import stirwright.correlation.Figures;

/** Whether a correlation gives usable numbers where it says that it holds. */
public final class StatedRange {

    private StatedRange() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        for (Correlation correlation : workpiece.correlations()) {
            Trials trials = workpiece.trials(correlation);
            Optional<Situation> unusable = trials.inside().stream().filter(s -> !usable(correlation, s)).findFirst();
            unusable.ifPresentOrElse(
                    s -> findings.add(correlation.id(), "within its stated bounds it " + words(correlation, s)),
                    // Beyond the bounds NaN is an answer, an exception never is.
                    () -> trials.probes().stream().filter(s -> !Outcome.of(correlation, s).failure().isEmpty()).findFirst()
                            .ifPresent(s -> findings.add(correlation.id(), "beyond its stated bounds it "
                                    + words(correlation, s) + "; NaN would do")));
        }
    }

    private static boolean usable(Correlation correlation, Situation situation) {
        Outcome outcome = Outcome.of(correlation, situation);
        return outcome.finite() && outcome.value() > 0;
    }

    private static String words(Correlation correlation, Situation situation) {
        Outcome outcome = Outcome.of(correlation, situation);
        List<String> state = correlation.reads().stream()
                .map(variable -> variable.title() + " " + Figures.show(situation.get(variable))).toList();
        return (outcome.failure().isEmpty() ? "gives " + Figures.show(outcome.value()) : "throws " + outcome.failure())
                + (state.isEmpty() ? " whatever the state" : " at " + String.join(", ", state));
    }
}
