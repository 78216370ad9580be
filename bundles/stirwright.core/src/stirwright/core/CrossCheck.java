package stirwright.core;

import stirwright.core.internal.CaseSolver;
import stirwright.correlation.Quantity;
import stirwright.correlation.Variable;

/**
 * Applies every installed correlation of a family to a case and compares them. The window, the
 * command line and the report all call this, so they cannot disagree.
 */
public final class CrossCheck {
    private final Catalogue catalogue;
    private final boolean everyQuantity;

    public CrossCheck(Catalogue catalogue) {
        this(catalogue, true);
    }

    private CrossCheck(Catalogue catalogue, boolean everyQuantity) {
        this.catalogue = catalogue;
        this.everyQuantity = everyQuantity;
    }

    /** The same without {@link CaseResult#quantities}, for tables of many cases that do not show them. */
    public CrossCheck withoutQuantities() {
        return new CrossCheck(catalogue, false);
    }

    /** Computes one case; what cannot be computed is refused in the result, never thrown. */
    public CaseResult check(CaseSpec spec) {
        try {
            return new CaseSolver(catalogue, spec).solve(everyQuantity);
        } catch (CaseRefusedException refused) {
            return CaseResult.refused(spec.name(), spec.familyId(), refused.refusal());
        }
    }

    /**
     * A candidate of a case over one variable.
     *
     * @param correlationId of a correlation for the quantity, or "given"
     * @throws CaseRefusedException when the case cannot be computed or has no such candidate
     */
    public Slice slice(CaseSpec spec, Quantity quantity, String correlationId, Variable over) {
        return new CaseSolver(catalogue, spec).slice(quantity, correlationId, over);
    }
}
