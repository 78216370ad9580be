package stirwright.core;

import stirwright.correlation.Correlation;
import stirwright.correlation.Effect;
import stirwright.correlation.Figures;

/**
 * A factor that accounts for one effect on a candidate.
 *
 * @param factor the modifier that gives it
 * @param value what it multiplies by here; NaN where it gives none
 * @param leftOut whether the case leaves its effect out, so that it is not applied
 */
public record FactorFinding(Correlation factor, double value, boolean leftOut) {

    public Effect effect() {
        return factor.modifierFor().orElseThrow();
    }

    /** One sentence, for instance "liquid depth: power number times 0.9 by general.np.depth". */
    public String words() {
        return effect().title() + ": " + factor.quantity().title()
                + (leftOut ? " without it, as the case says; it would be times " : " times ") + Figures.show(value) + " by "
                + factor.id() + (factor.citation().hasSource() ? "" : " (" + factor.citation() + ")");
    }
}
