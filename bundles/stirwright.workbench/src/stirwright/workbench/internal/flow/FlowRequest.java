package stirwright.workbench.internal.flow;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import stirwright.rheology.FitOptions;
import stirwright.rheology.FluidModel;

/**
 * What the flow-curve page is about, taken from the study on the user interface's thread.
 *
 * @param fluid its name; empty where the case has none
 * @param curves all measured curves of the fluid
 * @param targets what there is to fit to
 * @param target the one that is fitted to; empty without a usable curve
 * @param inUse the model that the fluid has in the study; empty where it has none that can be computed
 * @param reason why that was picked; may be empty
 * @param staticYield of the fluid, Pa; empty where it is not given or out of its limits
 * @param rates the shear rates that the case uses
 * @param selected key of the model whose band and residuals are asked for; may be that of none
 * @param shown which models were switched on or off by hand, by their keys
 */
record FlowRequest(
        String fluid, List<CurveData> curves, List<FitTarget> targets, Optional<FitTarget> target, FitOptions options, FlowView view,
        Optional<FluidModel> inUse, String reason, OptionalDouble staticYield, List<NamedRate> rates, String selected,
        Map<String, Boolean> shown) {

    FlowRequest {
        curves = List.copyOf(curves);
        targets = List.copyOf(targets);
        rates = List.copyOf(rates);
        shown = Map.copyOf(shown);
    }
}
