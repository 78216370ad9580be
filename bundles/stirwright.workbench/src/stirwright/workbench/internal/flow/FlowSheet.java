package stirwright.workbench.internal.flow;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import stirwright.chart.Picture;
import stirwright.rheology.MeasuredWindow;
import stirwright.rheology.YieldRange;

/**
 * All that the flow-curve page shows for one state of the study. Immutable.
 *
 * @param fluid its name; empty where the case has none
 * @param curves the measured curves of the fluid
 * @param targets what there is to fit to; empty without a used curve
 * @param target the one that is fitted to
 * @param rows the models, best first
 * @param selected the key of the row whose card is open; empty without rows
 * @param hidden the keys of the rows that are not drawn
 * @param window the shear rates that were measured of the target
 * @param yield the range of the yield stress over models, ramps and what was measured after rest; empty where there is none
 * @param reason why the recommended model is; empty without one
 * @param about what is to be said of the curves, whichever model is selected
 */
public record FlowSheet(
        String fluid, List<CurveData> curves, List<FitTarget> targets, Optional<FitTarget> target, List<ModelRow> rows,
        String selected, Set<String> hidden, MeasuredWindow window, Optional<YieldRange> yield, String reason, List<Section> about, Picture picture) {

    public FlowSheet {
        curves = List.copyOf(curves);
        targets = List.copyOf(targets);
        rows = List.copyOf(rows);
        hidden = Set.copyOf(hidden);
        about = List.copyOf(about);
    }

    /** Whether the fluid has no curve. */
    public boolean empty() {
        return curves.isEmpty();
    }
}
