package stirwright.conformance.internal;

import java.util.Optional;
import stirwright.correlation.Correlation;
import stirwright.correlation.Quantity;

/** Whether what a correlation names is there. */
public final class Names {

    private Names() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        for (Correlation correlation : workpiece.correlations()) {
            // A general relation may name families that other bundles will bring; one must be there.
            if (!correlation.families().isEmpty()
                    && correlation.families().stream().allMatch(id -> workpiece.family(id).isEmpty())) {
                findings.add(correlation.id(), "none of the families that it names is installed: "
                        + String.join(", ", correlation.families()));
            }
            correlation.belongsWith().ifPresent(id -> belonging(id, correlation, workpiece, findings));
        }
    }

    private static void belonging(String id, Correlation correlation, Workpiece workpiece, Findings findings) {
        Optional<Correlation> constant = workpiece.correlation(id);
        if (constant.isEmpty()) {
            findings.add(correlation.id(), "belongs with '" + id + "', which is not installed");
        } else if (!constant.get().quantity().equals(Quantity.SHEAR_RATE_CONSTANT)) {
            findings.add(correlation.id(), "belongs with '" + id + "', which is no shear-rate constant but a "
                    + constant.get().quantity().title());
        }
    }
}
