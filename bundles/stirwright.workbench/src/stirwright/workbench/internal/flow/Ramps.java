package stirwright.workbench.internal.flow;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.BooleanSupplier;
import stirwright.rheology.FlowCurve;
import stirwright.rheology.RankedFits;
import stirwright.rheology.YieldRange;

/** Up against down ramps of one temperature, and what all of them say of the yield stress. */
final class Ramps {
    private final FlowRequest request;
    private final FlowCalculation calculation;
    private final BooleanSupplier stale;

    /** Up and down ramps that belong together. */
    record Pair(String words, FlowCurve up, FlowCurve down) { }

    Ramps(FlowRequest request, FlowCalculation calculation, BooleanSupplier stale) {
        this.request = request;
        this.calculation = calculation;
        this.stale = stale;
    }

    /** Of each temperature the up ramps and the down ramps, pooled; those without a partner are left out. */
    List<Pair> pairs() {
        List<CurveData> used = request.curves().stream().filter(CurveData::used).toList();
        List<Pair> pairs = new ArrayList<>();
        for (List<CurveData> here : FitTarget.byTemperature(used)) {
            Optional<FlowCurve> up = ramp(here, CurveData.UP);
            Optional<FlowCurve> down = ramp(here, CurveData.DOWN);
            if (up.isPresent() && down.isPresent()) {
                pairs.add(new Pair(FlowAbout.temperature(here.get(0).temperature()), up.get(), down.get()));
            }
        }
        return pairs;
    }

    private static Optional<FlowCurve> ramp(List<CurveData> curves, String ramp) {
        return FlowCalculation.pooled(curves.stream().filter(c -> c.ramp().equals(ramp)).toList());
    }

    /**
     * The range over models, ramps and what was measured after rest; empty where no model with a yield stress describes the
     * points and nothing was. Other ramps of the same
     * temperature count too: which of them a vessel sees depends on what was done to the product before.
     */
    Optional<YieldRange> yield(Optional<RankedFits> fits) {
        Map<String, RankedFits> all = new LinkedHashMap<>();
        request.target().ifPresent(t -> fits.ifPresent(f -> all.put(t.title(), f)));
        request.target().ifPresent(t -> request.targets().stream().filter(other -> other.key().startsWith("group "))
                .filter(other -> sameTemperature(other, t))
                .forEach(other -> calculation.fits(other.curves(), request.options(), stale).ifPresent(f -> all.put(other.title(), f))));
        return YieldRange.of(all, request.staticYield());
    }

    private static boolean sameTemperature(FitTarget one, FitTarget other) {
        List<CurveData> both = new ArrayList<>(one.curves());
        both.addAll(other.curves());
        return FitTarget.temperatures(both).size() == 1;
    }
}
