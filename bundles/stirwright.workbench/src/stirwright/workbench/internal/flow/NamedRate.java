package stirwright.workbench.internal.flow;

import java.util.ArrayList;
import java.util.List;
import stirwright.workbench.internal.session.Outcome;

/**
 * A shear rate that the case at hand uses, by its name. Whatever the product learns to compute joins the list here.
 *
 * @param name for instance "average at the impeller"
 * @param rate 1/s
 */
public record NamedRate(String name, double rate) {

    /** Those of the pick of a case, the one that its viscosity is taken at first; none where nothing was computed. */
    static List<NamedRate> of(Outcome outcome) {
        List<NamedRate> all = new ArrayList<>();
        outcome.main().result().pick().ifPresent(pick -> {
            pick.state().ifPresent(state -> add(all, FlowWords.Rate_impeller, state.shearRate()));
            add(all, FlowWords.Rate_powerBased, pick.powerBasedShearRate());
        });
        return all;
    }

    private static void add(List<NamedRate> all, String name, double rate) {
        if (rate > 0 && Double.isFinite(rate)) {
            all.add(new NamedRate(name, rate));
        }
    }
}
