package stirwright.core;

import java.util.Optional;
import stirwright.core.internal.CaseSolver;

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
        return open(spec).result();
    }

    /** Computes one case and keeps what its curves are drawn from; refuses as {@link #check} does. */
    public OpenCase open(CaseSpec spec) {
        Optional<CaseSolver> solver = Optional.empty();
        try {
            solver = Optional.of(new CaseSolver(catalogue, spec));
            return new OpenCase(solver.get().solve(everyQuantity), solver);
        } catch (CaseRefusedException refused) {
            return new OpenCase(CaseResult.refused(spec.name(), spec.familyId(), refused.refusal()), solver);
        }
    }
}
