package stirwright.conformance.internal;

import java.util.List;
import stirwright.core.CaseRefusedException;
import stirwright.core.VesselGeometry;
import stirwright.correlation.ContractException;
import stirwright.correlation.Family;

/** Whether a family's dimensions follow from those that must be given. */
public final class FamilyGeometry {

    private FamilyGeometry() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        for (Family family : workpiece.offer().families()) {
            for (int baffles : List.of(0, StandardCase.BAFFLES)) {
                try {
                    VesselGeometry.resolve(family, StandardCase.given(family, baffles));
                } catch (CaseRefusedException | ContractException refused) {
                    findings.add(family.id(), "with " + baffles + " baffles and defaults for the rest: " + refused.getMessage()
                            + "; a default may read only what the family lists before it");
                }
            }
        }
    }
}
