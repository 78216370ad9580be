package stirwright.core;

import java.util.List;
import java.util.Optional;

/**
 * What came out for one case.
 *
 * @param name of the case
 * @param family id
 * @param spread largest over smallest power among the candidates that qualify; NaN when none does
 * @param candidates the power-number candidates, the pick first; empty when refused
 * @param quantities every correlation for every quantity, the other quantities at their pick
 * @param flags why the case is flagged, a sentence each
 * @param notes what else a reader must know: defaults used, effects, cautions
 * @param refusal why nothing was computed
 */
public record CaseResult(
        String name, String family, Status status, double spread, List<CandidateResult> candidates,
        List<QuantityResult> quantities, List<String> flags, List<String> notes, Optional<Refusal> refusal) {

    /** A case that was not computed. */
    public static CaseResult refused(String name, String family, Refusal refusal) {
        return new CaseResult(name, family, Status.REFUSED, Double.NaN, List.of(), List.of(),
                List.of(), List.of(), Optional.of(refusal));
    }

    /** The candidate that is used: chosen, recommended, or the nearest when none qualifies. */
    public Optional<CandidateResult> pick() {
        return candidates.stream().findFirst();
    }
}
