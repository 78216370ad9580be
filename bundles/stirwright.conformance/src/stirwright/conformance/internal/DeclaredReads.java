package stirwright.conformance.internal;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import stirwright.correlation.Correlation;
import stirwright.correlation.Variable;

/** Whether a correlation reads what it says: the implicit loops are settled by it. */
public final class DeclaredReads {

    private DeclaredReads() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        for (Correlation correlation : workpiece.correlations()) {
            Set<Variable> read = new LinkedHashSet<>();
            List<Situation> probes = workpiece.trials(correlation).probes();
            for (Situation situation : probes) {
                ReadLog log = new ReadLog(situation);
                Outcome.of(correlation, log, log);
                read.addAll(log.variables());
            }
            read.stream().filter(v -> !correlation.reads().contains(v)).forEach(v -> findings.add(correlation.id(),
                    "reads the " + v.title() + " without declaring it; add it to reads(...)"));
            correlation.reads().stream().filter(v -> !probes.isEmpty() && !read.contains(v)).forEach(v ->
                    findings.add(correlation.id(), "declares that it reads the " + v.title()
                            + " and never does; take it out of reads(...)"));
        }
    }
}
