package stirwright.conformance.internal;

import java.util.Arrays;
import java.util.HashSet;
import java.util.Set;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;

/** Whether ids are unique and say what they should. */
public final class Ids {
    private static final int PARTS = 3;

    private Ids() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        Set<String> families = new HashSet<>();
        for (Family family : workpiece.ownFamilies()) {
            if (!families.add(family.id())) {
                findings.add(family.id(), "the bundle describes this family twice");
            }
            workpiece.others().family(family.id()).ifPresent(other -> findings.add(family.id(),
                    "the family is described by " + workpiece.others().originOf(other) + " already"));
        }
        Set<String> correlations = new HashSet<>();
        for (Correlation correlation : workpiece.correlations()) {
            if (!correlations.add(correlation.id())) {
                findings.add(correlation.id(), "the bundle has two correlations of this id");
            }
            workpiece.others().entry(correlation.id()).ifPresent(other -> findings.add(correlation.id(),
                    "the id is taken by " + other.origin()));
            form(correlation, workpiece, findings);
        }
    }

    private static void form(Correlation correlation, Workpiece workpiece, Findings findings) {
        String[] parts = correlation.id().split("\\.");
        Set<String> firstWords = new HashSet<>(correlation.families());
        workpiece.ownFamilies().forEach(f -> firstWords.add(f.id()));
        firstWords.addAll(Arrays.asList(workpiece.origin().split("[^a-z0-9]+")));
        if (parts.length != PARTS || !firstWords.contains(parts[0])) {
            findings.add(correlation.id(), "the id must be three parts, 'family.quantity.source'; the first is a family that"
                    + " it is made for or a word of the bundle's symbolic name, here '" + parts[0] + "'");
        }
    }
}
