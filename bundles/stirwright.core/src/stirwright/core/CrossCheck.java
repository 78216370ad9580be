package stirwright.core;

import stirwright.core.internal.CaseSolver;

/**
 * Applies every installed correlation of a family to a case and compares them. The window, the
 * command line and the report all call this, so they cannot disagree.
 */
public final class CrossCheck {
    private final Catalogue catalogue;

    public CrossCheck(Catalogue catalogue) {
        this.catalogue = catalogue;
    }

    /** Computes one case; what cannot be computed is refused in the result, never thrown. */
    public CaseResult check(CaseSpec spec) {
        try {
            return new CaseSolver(catalogue, spec).solve();
        } catch (CaseRefusedException refused) {
            return CaseResult.refused(spec.name(), spec.familyId(), refused.refusal());
        }
    }
}
