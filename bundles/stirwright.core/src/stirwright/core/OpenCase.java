package stirwright.core;

import java.util.List;
import java.util.Optional;
import stirwright.core.internal.CaseSolver;
import stirwright.correlation.Quantity;
import stirwright.correlation.Variable;

/**
 * A case that was computed and is looked at further: its candidates as curves, and each candidate's bounds one by one.
 * Nothing is solved twice. Not thread-safe.
 */
public final class OpenCase {
    private final CaseResult result;
    private final Optional<CaseSolver> solver;

    OpenCase(CaseResult result, Optional<CaseSolver> solver) {
        this.result = result;
        this.solver = solver;
    }

    /** The same as {@link CrossCheck#check} gives. */
    public CaseResult result() {
        return result;
    }

    /** The vessel with every blank filled; empty when it was refused. */
    public Optional<VesselGeometry> vessel() {
        return solver.map(CaseSolver::vessel);
    }

    /**
     * A candidate over one variable.
     *
     * @param correlationId of a correlation for the quantity, or "given"
     * @throws CaseRefusedException when the case was refused or has no such candidate
     */
    public Slice slice(Quantity quantity, String correlationId, Variable over) {
        return computed().slice(quantity, correlationId, over);
    }

    /**
     * How the case stands to each bound of a candidate, those of its modifiers after its own, the other quantities at
     * their pick; empty for a given value.
     *
     * @throws CaseRefusedException when the case was refused or has no such candidate
     */
    public List<BoundFinding> bounds(Quantity quantity, String correlationId) {
        return computed().bounds(quantity, correlationId);
    }

    /**
     * The factors on a candidate, and those that the case leaves out, the other quantities at their pick.
     *
     * @throws CaseRefusedException when the case was refused or has no such candidate
     */
    public List<FactorFinding> factors(Quantity quantity, String correlationId) {
        return computed().factors(quantity, correlationId);
    }

    /** What the case was computed with: all that is installed, and what it changed of it; empty when it was refused. */
    public Optional<Catalogue> catalogue() {
        return solver.map(CaseSolver::catalogue);
    }

    private CaseSolver computed() {
        return solver.filter(s -> result.refusal().isEmpty()).orElseThrow(() -> {
            Refusal refusal = result.refusal().orElseThrow();
            return new CaseRefusedException(refusal.field(), refusal.value(), refusal.reason());
        });
    }
}
