package stirwright.core;

import java.util.List;
import java.util.Map;
import stirwright.rheology.Fluid;

/**
 * One case: a fluid in a vessel with an impeller at a speed or for a target.
 *
 * @param name unique among the cases of a table
 * @param familyId the impeller family
 * @param geometry given dimensions by parameter id, in SI units (angles in rad)
 * @param remarks what the reader of the input has to say about it, printed with the result
 */
public record CaseSpec(
        String name, String familyId, Map<String, Double> geometry, SpeedDemand speed, Fluid fluid,
        Choices choices, List<String> remarks) {
    public CaseSpec {
        geometry = Map.copyOf(geometry);
        remarks = List.copyOf(remarks);
    }

    /** The same case at another speed or for another target. */
    public CaseSpec with(SpeedDemand otherSpeed) {
        return new CaseSpec(name, familyId, geometry, otherSpeed, fluid, choices, remarks);
    }
}
