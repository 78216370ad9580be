package stirwright.conformance.internal;

import java.util.Locale;
import stirwright.correlation.Correlation;
import stirwright.correlation.Figures;

/** Whether the published numbers are there, readable and met. */
public final class References {

    private References() {}

    public static void read(Workpiece workpiece, Findings findings) {
        workpiece.references().problems().forEach(problem -> findings.add(problem.place(), problem.message()));
    }

    public static void cover(Workpiece workpiece, Findings findings) {
        for (Correlation correlation : workpiece.offer().correlations()) {
            if (workpiece.references().of(correlation).isEmpty()) {
                findings.add(correlation.id(), "has no reference row that could be read; put one into"
                        + " reference/<name>.csv of the bundle");
            }
        }
    }

    public static void met(Workpiece workpiece, Findings findings) {
        for (ReferenceRow row : workpiece.references().rows()) {
            Outcome outcome = Outcome.of(row.correlation(), row.situation());
            double deviation = outcome.value() / row.expected() - 1;
            if (!outcome.failure().isEmpty()) {
                findings.add(row.place(), row.correlation().id() + " throws " + outcome.failure());
            } else if (!(Math.abs(deviation) <= row.kind().tolerance())) {
                findings.add(row.place(), String.format(Locale.ROOT,
                        "%s gives %s where %s is expected: off by %.2f %%, allowed for a %s is %.1f %%",
                        row.correlation().id(), Figures.show(outcome.value()), Figures.show(row.expected()),
                        100 * deviation, row.kind().id(), 100 * row.kind().tolerance()));
            }
        }
    }
}
