package stirwright.cards.internal;

import stirwright.correlation.Figures;
import stirwright.correlation.RegimeLimits;

/** Where a family's regimes end, for all fluids and for those that its sources tell apart. */
final class RegimeWords {
    private RegimeWords() {}

    static void write(Html html, RegimeLimits regimes) {
        html.leaf("p", "Laminar up to " + limits(regimes)).line();
        regimes.shearThinning().ifPresent(thinning ->
                html.leaf("p", "For fluids that thin with shear or have a yield stress: laminar up to " + limits(thinning)).line());
    }

    private static String limits(RegimeLimits regimes) {
        return "Reynolds number " + Figures.show(regimes.laminarUpTo()) + ", turbulent from "
                + Figures.show(regimes.turbulentFrom()) + " (" + regimes.citation() + ")."
                + (regimes.remark().isEmpty() ? "" : " " + Holdings.heading(regimes.remark())
                        + (regimes.remark().endsWith(".") ? "" : "."));
    }
}
