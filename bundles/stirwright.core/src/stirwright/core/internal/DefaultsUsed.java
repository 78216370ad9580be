package stirwright.core.internal;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Predicate;
import java.util.stream.Stream;
import stirwright.core.CaseSpec;
import stirwright.core.SpeedDemand;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Dimensions;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.GeometryParameter.Default;

/** The dimensions that nobody gave: those on which the pick rests, and those that other numbers rest on. */
final class DefaultsUsed {
    private final VesselGeometry vessel;
    private final Set<GeometryParameter> matter = new LinkedHashSet<>();
    private final Set<GeometryParameter> used = new LinkedHashSet<>();

    /** @param restsOnConstant whether the power rests on the shear-rate constant */
    DefaultsUsed(CaseSpec spec, VesselGeometry vessel, ResultAssembly.Row row, boolean restsOnConstant) {
        this.vessel = vessel;
        matter.addAll(row.power().trial().candidate().defaultsRead());
        if (restsOnConstant) {
            matter.addAll(readBy(row.constants()));
        }
        used.addAll(readBy(row.constants()));
        used.addAll(readBy(row.flows()));
        used.add(Dimensions.CLEARANCE);
        // The power per volume, the depth and most ratios rest on it.
        matter.add(Dimensions.VESSEL_DIAMETER);
        List<GeometryParameter> volume = vessel.defaulted().contains(Dimensions.LIQUID_VOLUME)
                ? List.of(Dimensions.LIQUID_VOLUME, Dimensions.LIQUID_HEIGHT)
                : List.of(Dimensions.LIQUID_HEIGHT);
        (spec.speed() instanceof SpeedDemand.ForPowerPerVolume ? matter : used).addAll(volume);
    }

    private static Set<GeometryParameter> readBy(Selection selection) {
        return selection.pick().map(r -> r.trial().candidate().defaultsRead()).orElse(Set.of());
    }

    /** Standard geometry on which the pick, or its shear rate, rests. */
    Optional<String> assumedThatMatter() {
        return inWords(p -> vessel.defaultKind(p) == Default.ASSUMED && matter.contains(p));
    }

    /** What else was filled in. */
    Optional<String> others() {
        return inWords(p -> vessel.defaultKind(p) == Default.ASSUMED
                ? used.contains(p) && !matter.contains(p)
                : used.contains(p) || matter.contains(p));
    }

    private Optional<String> inWords(Predicate<GeometryParameter> which) {
        Stream<String> words = vessel.defaulted().stream().filter(which).map(vessel::defaultInWords);
        return Optional.of(String.join(", ", words.toList())).filter(w -> !w.isEmpty());
    }
}
