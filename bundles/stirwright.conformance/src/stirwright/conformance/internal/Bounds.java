package stirwright.conformance.internal;

import static stirwright.correlation.Dimensions.WALL_GAP;

import java.util.List;
import java.util.regex.Pattern;
import stirwright.correlation.Bound;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.Measure;
import stirwright.correlation.Term;

/** Whether the bounds that a reader asks for first are spoken of. */
public final class Bounds {

    /** Two words at least: a reason is more than a mark. */
    private static final Pattern REASON = Pattern.compile(".*\\p{L}{2,}.*\\s.*\\p{L}{2,}.*");

    private Bounds() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        for (Correlation correlation : workpiece.correlations()) {
            List<Term> subjects = correlation.validity().stream().map(Bound::subject).toList();
            demand(subjects.contains(Measure.REYNOLDS), "Reynolds number (Measure.REYNOLDS)", correlation, findings);
            // A count alone does not do: what is recommended must state the class.
            demand(subjects.contains(Classifier.BAFFLING), "baffling (Classifier.BAFFLING)", correlation, findings);
            demand(subjects.contains(Measure.D_OVER_T) || subjects.stream().anyMatch(Bounds::ofWallGap),
                    "impeller over vessel diameter (Measure.D_OVER_T)", correlation, findings);
            demand(subjects.contains(Classifier.FLUID), "fluid (fluids(...) or Classifier.FLUID)", correlation, findings);
            for (Bound bound : correlation.validity()) {
                if (bound instanceof Bound.NotStated silent && !REASON.matcher(silent.reason()).matches()) {
                    findings.add(correlation.id(), "the bound on " + silent.subject().title()
                            + " is not stated, and '" + silent.reason() + "' is no reason");
                }
            }
        }
    }

    private static void demand(boolean met, String what, Correlation correlation, Findings findings) {
        if (!met) {
            findings.add(correlation.id(), "says nothing of the " + what
                    + "; state the bound, or say notStated(...) with the reason");
        }
    }

    /** Close-clearance impellers are described by the gap, which says the same as D/T. */
    private static boolean ofWallGap(Term subject) {
        return subject.id().startsWith(WALL_GAP.id());
    }
}
