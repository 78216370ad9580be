package stirwright.conformance.internal;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;
import stirwright.correlation.Figures;

/** Whether the published numbers are there, readable, within the stated bounds and met. */
public final class References {

    private References() {}

    public static void read(Workpiece workpiece, Findings findings) {
        workpiece.references().problems().forEach(problem -> findings.add(problem.place(), problem.message()));
    }

    public static void cover(Workpiece workpiece, Findings findings) {
        for (Correlation correlation : workpiece.correlations()) {
            List<ReferenceRow> rows = workpiece.references().of(correlation);
            List<Family> families = correlation.families().stream().flatMap(id -> workpiece.family(id).stream()).toList();
            if (rows.stream().noneMatch(ReferenceRow::within)) {
                findings.add(correlation.id(), "has no reference row within its stated bounds that could be read; put one"
                        + " into reference/<name>.csv of the bundle");
            } else {
                families.stream().filter(family -> rows.stream()
                                .noneMatch(row -> row.within() && row.family().id().equals(family.id())))
                        .forEach(family -> findings.add(correlation.id(), "is made for family " + family.id()
                                + " too, and has no reference row within its stated bounds for it"));
            }
        }
    }

    public static void mark(Workpiece workpiece, Findings findings) {
        for (ReferenceRow row : workpiece.references().rows()) {
            Optional<String> obstacle = row.obstacle();
            if (row.markedOutside() && obstacle.isEmpty()) {
                findings.add(row.place(), "is marked outside, but every stated bound is met");
            } else if (!row.markedOutside() && obstacle.isPresent()) {
                findings.add(row.place(), "is outside what " + row.correlation().id() + " was made for: " + obstacle.get()
                        + "; put 'yes' into a column '" + Columns.OUTSIDE + "' if that is meant");
            }
        }
    }

    public static void met(Workpiece workpiece, Findings findings) {
        for (ReferenceRow row : workpiece.references().rows()) {
            Outcome outcome = Outcome.of(row.correlation(), row.situation());
            if (!outcome.failure().isEmpty()) {
                findings.add(row.place(), row.correlation().id() + " throws " + outcome.failure());
            } else if (row.missedBy(row.correlation())) {
                findings.add(row.place(), String.format(Locale.ROOT,
                        "%s gives %s where %s is expected: off by %.2f %%, allowed for a %s row is %.1f %%",
                        row.correlation().id(), Figures.show(outcome.value()), Figures.show(row.expected()),
                        100 * row.deviation(row.correlation()), row.kind().id(), 100 * row.tolerance()));
            }
        }
    }
}
