package stirwright.conformance.internal;

import java.util.HashSet;
import java.util.Set;
import stirwright.correlation.Family;
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;

/** Whether a family's dimensions follow from those that must be given. */
public final class FamilyGeometry {

    private FamilyGeometry() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        workpiece.ownFamilies().forEach(family -> examine(family, findings));
    }

    private static void examine(Family family, Findings findings) {
        Set<GeometryParameter> listed = new HashSet<>();
        for (GeometryParameter parameter : family.parameters()) {
            Set<GeometryParameter> read = new HashSet<>();
            // Zero and one: a default may ask whether there are baffles at all.
            for (double value : new double[] {0, 1}) {
                Geometry reading = other -> {
                    read.add(other);
                    return value;
                };
                // What is derived may read any dimension and gives NaN where that one was not given.
                parameter.fallbacks().stream().filter(f -> f.kind() != GeometryParameter.Default.DERIVED)
                        .forEach(f -> f.value(reading));
            }
            read.stream().filter(other -> !listed.contains(other)).forEach(other -> findings.add(family.id(),
                    "the default of " + parameter.column() + " reads " + other.column() + "; a default may read only what"
                            + " the family lists before it"));
            listed.add(parameter);
        }
    }
}
