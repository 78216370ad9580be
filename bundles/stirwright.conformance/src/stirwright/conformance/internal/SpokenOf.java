package stirwright.conformance.internal;

import java.util.LinkedHashSet;
import java.util.Set;
import stirwright.correlation.Bound;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.Measure;

/**
 * Whether every dimension that a correlation reads is spoken of by a bound. Fewer bounds that are not
 * stated rank higher, so silence must not be an advantage.
 */
public final class SpokenOf {

    private SpokenOf() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        for (Correlation correlation : workpiece.correlations()) {
            Set<GeometryParameter> silent = new LinkedHashSet<>();
            for (Situation situation : workpiece.trials(correlation).probes()) {
                ReadLog formula = new ReadLog(situation);
                Outcome.of(correlation, formula, formula);
                Set<GeometryParameter> read = new LinkedHashSet<>(formula.dimensions());
                read.removeAll(spokenOf(correlation, situation));
                silent.addAll(read);
            }
            silent.forEach(p -> findings.add(correlation.id(), "reads the " + p.title() + " (" + p.id()
                    + "), and no bound speaks of it; state its range, or say notStated(...) with the reason"));
        }
    }

    private static Set<GeometryParameter> spokenOf(Correlation correlation, Situation situation) {
        ReadLog bounds = new ReadLog(situation);
        for (Bound bound : correlation.validity()) {
            if (bound.subject() instanceof Measure measure) {
                measure.value(bounds, bounds);
            } else if (bound.subject() instanceof Classifier classifier) {
                classifier.label(bounds, bounds);
            } else if (bound.subject() instanceof GeometryParameter parameter) {
                bounds.get(parameter);
            }
        }
        if (correlation.modifierFor().isPresent()) {
            // When a factor applies is a bound in all but name.
            correlation.appliesTo(bounds);
        }
        return bounds.dimensions();
    }
}
