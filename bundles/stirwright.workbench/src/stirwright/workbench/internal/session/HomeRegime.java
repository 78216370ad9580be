package stirwright.workbench.internal.session;

import java.util.Optional;
import stirwright.core.Catalogue;
import stirwright.core.FluidState;
import stirwright.correlation.Bound;
import stirwright.correlation.Measure;
import stirwright.correlation.Regime;
import stirwright.correlation.RegimeLimits;

/**
 * How far a curve can be drawn as if its source stood behind it. Where no range of the Reynolds number is stated, that is the
 * regime in which the case lies: a law made for laminar flow must not look like one for turbulent flow.
 */
final class HomeRegime {
    private final boolean stated;
    private final RegimeLimits limits;
    private final Optional<Regime> home;

    private HomeRegime(boolean stated, RegimeLimits limits, Optional<Regime> home) {
        this.stated = stated;
        this.limits = limits;
        this.home = home;
    }

    static HomeRegime of(Catalogue catalogue, Sheet sheet, Row row) {
        // A value that somebody gave has no source that could state anything.
        boolean stated = row.correlation().map(c -> c.bound(Measure.REYNOLDS).map(Bound::stated).orElse(false)).orElse(true);
        RegimeLimits limits = limits(catalogue, sheet);
        return new HomeRegime(stated, limits, state(sheet).map(s -> limits.at(s.reynolds())));
    }

    /** Those of the sheet's family for the fluid of the case. */
    static RegimeLimits limits(Catalogue catalogue, Sheet sheet) {
        RegimeLimits ofFamily = catalogue.family(sheet.familyId()).orElseThrow().regimes();
        return state(sheet).map(s -> ofFamily.forFluid(s.fluid())).orElse(ofFamily);
    }

    private static Optional<FluidState> state(Sheet sheet) {
        return sheet.result().pick().flatMap(p -> p.state());
    }

    boolean covers(double reynolds) {
        return stated || home.filter(regime -> regime == limits.at(reynolds)).isPresent();
    }
}
