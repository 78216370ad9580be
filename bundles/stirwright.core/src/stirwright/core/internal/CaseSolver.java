package stirwright.core.internal;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import stirwright.core.BoundFinding;
import stirwright.core.CaseRefusedException;
import stirwright.core.CaseResult;
import stirwright.core.CaseSpec;
import stirwright.core.Catalogue;
import stirwright.core.Choices;
import stirwright.core.FactorFinding;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.core.Role;
import stirwright.core.Slice;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.Figures;
import stirwright.correlation.Quantity;
import stirwright.correlation.Variable;

/**
 * Solves one case in one direction: fluid, shear-rate constant and speed to the state of the
 * product, then the power number, then the flow number, for every candidate.
 */
public final class CaseSolver {
    private final CaseSpec spec;
    private final Catalogue catalogue;
    private final Family family;
    private final VesselGeometry vessel;
    private final Candidates candidates;
    private final List<Candidate> powers;
    private final Trials trials;
    private final StateSolver states;
    /** What {@link #solve} found, for the curves. */
    private List<PowerTrial> tried;
    private Selection.Ranked pick;
    /** The candidates again, so that code that fails far from the case fails in the drawing alone. */
    private final Map<Quantity, List<Candidate>> drawn = new HashMap<>();

    /** @throws CaseRefusedException naming the field and the value that stand in the way */
    public CaseSolver(Catalogue installed, CaseSpec spec) {
        this.spec = spec;
        this.catalogue = Settled.catalogue(installed, spec.choices());
        this.family = catalogue.family(spec.familyId()).orElseThrow(() -> new CaseRefusedException(
                "family", spec.familyId(), "is not installed; there are "
                        + String.join(", ", catalogue.families().stream().map(Family::id).sorted().toList())));
        this.vessel = resolved();
        this.candidates = new Candidates(catalogue, family, vessel, spec);
        this.powers = needed(Quantity.POWER_NUMBER);
        this.trials = new Trials(candidates.of(Quantity.FLOW_NUMBER),
                new LaminarPower(powers, spec, vessel.get(Dimensions.IMPELLER_DIAMETER)), spec.choices());
        this.states = new StateSolver(spec, vessel, needed(Quantity.SHEAR_RATE_CONSTANT), trials);
    }

    /** A family's defaults and rules are code of another bundle. */
    private VesselGeometry resolved() {
        ForeignCode foreign = new ForeignCode();
        return foreign.call(() -> Optional.of(VesselGeometry.resolve(family, spec.geometry())), Optional.<VesselGeometry>empty())
                .orElseThrow(() -> new CaseRefusedException(
                        "family", family.id(), "cannot be used, its code fails: " + foreign.failure()));
    }

    private List<Candidate> needed(Quantity quantity) {
        List<Candidate> all = candidates.of(quantity);
        if (all.isEmpty()) {
            throw new CaseRefusedException("family", family.id(), "has no installed correlation for the "
                    + quantity.title() + "; give a value in the column " + Choices.givenField(quantity));
        }
        return all;
    }

    /** A power candidate and the shear-rate constants that were tried for it. */
    private record PowerTrial(Trial trial, Selection constants) {}

    /**
     * @param everyQuantity whether the result lists the candidates for every quantity
     * @throws CaseRefusedException when no candidate can be computed
     */
    public CaseResult solve(boolean everyQuantity) {
        tried = powers.stream().map(this::tryPower).toList();
        Selection selection = select(tried);
        pick = usablePick(selection);
        List<ResultAssembly.Row> rows = new ArrayList<>();
        for (Selection.Ranked ranked : selection.ranked()) {
            rows.add(new ResultAssembly.Row(ranked,
                    everyQuantity && ranked == pick ? states.all(ranked.trial().candidate()) : constantsOf(ranked, tried),
                    ranked.trial().state().map(trials::flowsAt).orElse(Selection.NONE)));
        }
        return new ResultAssembly(spec, catalogue, family, vessel, pick,
                new YieldPowers(spec, vessel.get(Dimensions.IMPELLER_DIAMETER), trials))
                .assemble(rows, everyQuantity ? quantities(selection, rows.get(0), pick) : List.of());
    }

    private List<Selection> quantities(Selection power, ResultAssembly.Row pickRow, Selection.Ranked pick) {
        List<Selection> all = new ArrayList<>(List.of(power, pickRow.constants(), pickRow.flows()));
        all.addAll(further(pick));
        return all;
    }

    /** The vessel with every blank filled. */
    public VesselGeometry vessel() {
        return vessel;
    }

    /** What is installed, and what the case changed of it. */
    public Catalogue catalogue() {
        return catalogue;
    }

    /**
     * Only after {@link #solve}.
     *
     * @throws CaseRefusedException when the case has no such candidate
     */
    public Slice slice(Quantity quantity, String correlationId, Variable over) {
        Candidate candidate = candidate(quantity, correlationId);
        return new CandidateSlice(candidate, pick.trial().state().orElseThrow(), trials.point(pick, candidate), over);
    }

    /**
     * Only after {@link #solve}.
     *
     * @throws CaseRefusedException when the case has no such candidate
     */
    public List<BoundFinding> bounds(Quantity quantity, String correlationId) {
        Candidate candidate = candidate(quantity, correlationId);
        FluidState state = ownState(candidate);
        return candidate.findings(ownPoint(candidate, state), state);
    }

    /**
     * Only after {@link #solve}.
     *
     * @throws CaseRefusedException when the case has no such candidate
     */
    public List<FactorFinding> factors(Quantity quantity, String correlationId) {
        Candidate candidate = candidate(quantity, correlationId);
        FluidState state = ownState(candidate);
        return candidate.factors(ownPoint(candidate, state), state);
    }

    private Point ownPoint(Candidate candidate, FluidState state) {
        return trials.setUp(trials.point(pick, candidate), state, candidate);
    }

    /** A power candidate may have a speed of its own; everything else is seen at the pick's state. */
    private FluidState ownState(Candidate candidate) {
        return tried.stream().filter(t -> t.trial().candidate().id().equals(candidate.id()))
                .findFirst().flatMap(t -> t.trial().state()).orElseGet(() -> pick.trial().state().orElseThrow());
    }

    private Candidate candidate(Quantity quantity, String correlationId) {
        return drawn.computeIfAbsent(quantity, candidates::of).stream()
                .filter(c -> c.id().equals(correlationId)).findFirst()
                .orElseThrow(() -> new CaseRefusedException(Choices.field(quantity), correlationId,
                        "is not a candidate for the " + quantity.title() + " of family " + family.id()));
    }

    private PowerTrial tryPower(Candidate power) {
        Selection constants = states.forPick(power);
        Optional<FluidState> state = constants.pick().flatMap(r -> r.trial().state());
        Trial trial = state.map(s -> trials.at(s, power)).orElseGet(() -> Trials.nowhere(
                power, constants.ranked().get(0).trial().assessment().obstacle()));
        return new PowerTrial(trial, constants);
    }

    private Selection select(List<PowerTrial> tried) {
        return Selection.of(tried.stream().map(PowerTrial::trial).toList(),
                spec.choices().correlation(Quantity.POWER_NUMBER), Optional.empty());
    }

    private static Selection constantsOf(Selection.Ranked ranked, List<PowerTrial> tried) {
        return tried.stream().filter(t -> t.trial() == ranked.trial()).findFirst().orElseThrow().constants();
    }

    private Selection.Ranked usablePick(Selection selection) {
        Selection.Ranked pick = selection.pick().filter(p -> p.trial().usable())
                .orElseThrow(() -> nothingComputed(selection.ranked().get(0)));
        // One made for another kind of vessel must not stand in because those made for this kind meet no target.
        boolean otherVessel = pick.role() == Role.EXCLUDED && !pick.trial().candidate().fitsVessel();
        selection.ranked().stream()
                .filter(r -> otherVessel && r.trial().state().isEmpty() && r.trial().trustworthy()
                        && r.trial().candidate().fitsVessel())
                .findFirst()
                .ifPresent(r -> {
                    throw nothingComputed(r);
                });
        return pick;
    }

    /** Every other quantity, each correlation at the pick's state with the pick's power and flow number. */
    private List<Selection> further(Selection.Ranked pick) {
        return candidates.furtherQuantities().stream()
                .map(quantity -> Selection.of(
                        candidates.of(quantity).stream().map(c -> trials.at(pick, c)).toList(),
                        spec.choices().correlation(quantity), Optional.empty()))
                .toList();
    }

    /** No state was found, or the correlation that the case asks for has no number. */
    private CaseRefusedException nothingComputed(Selection.Ranked ranked) {
        String obstacle = ranked.trial().assessment().obstacle();
        Optional<String> withoutValue = ranked.trial().state().isPresent() ? Optional.empty() : states.chosenWithoutValue();
        if (withoutValue.isPresent()) {
            return new CaseRefusedException(Choices.published(withoutValue.get()).isPresent() ? Choices.CONSTANTS
                    : Choices.field(Quantity.SHEAR_RATE_CONSTANT), withoutValue.get(), "leads to no power: " + obstacle);
        }
        if (ranked.role() != Role.CHOSEN || ranked.trial().state().isEmpty()) {
            return new CaseRefusedException(spec.speed().field(), Figures.show(spec.speed().value()),
                    "leads to no power: " + obstacle);
        }
        return new CaseRefusedException(Choices.field(Quantity.POWER_NUMBER), ranked.id(), "gives no power: " + obstacle);
    }
}
