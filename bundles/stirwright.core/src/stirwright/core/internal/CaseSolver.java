package stirwright.core.internal;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.apache.commons.math3.analysis.UnivariateFunction;
import stirwright.core.CaseRefusedException;
import stirwright.core.CaseResult;
import stirwright.core.CaseSpec;
import stirwright.core.Catalogue;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.core.SpeedDemand;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.Quantity;
import stirwright.correlation.Variable;

/**
 * Solves one case in one direction: fluid, shear-rate constant and speed to the state of the
 * product, then the power number, then the flow number, for every candidate.
 */
public final class CaseSolver {
    private final CaseSpec spec;
    private final Family family;
    private final VesselGeometry vessel;
    private final Candidates candidates;
    private final List<Candidate> powers;
    private final List<Candidate> constants;
    private final List<Candidate> flows;
    private final Coupling coupling;
    private final double diameter;
    private final double volume;
    private final Map<FluidState, Selection> flowsByState = new IdentityHashMap<>();
    private Optional<List<Trial>> sharedConstants = Optional.empty();

    /** @throws CaseRefusedException naming the field and the value that stand in the way */
    public CaseSolver(Catalogue catalogue, CaseSpec spec) {
        this.spec = spec;
        this.family = catalogue.family(spec.familyId()).orElseThrow(() -> new CaseRefusedException(
                "family", spec.familyId(), "is not installed; there are "
                        + String.join(", ", catalogue.families().stream().map(Family::id).sorted().toList())));
        this.vessel = VesselGeometry.resolve(family, spec.geometry());
        this.candidates = new Candidates(catalogue, family, vessel, spec);
        this.powers = candidates.of(Quantity.POWER_NUMBER);
        this.constants = candidates.of(Quantity.SHEAR_RATE_CONSTANT);
        this.flows = candidates.of(Quantity.FLOW_NUMBER);
        this.diameter = vessel.get(Dimensions.IMPELLER_DIAMETER);
        this.volume = vessel.get(Dimensions.LIQUID_VOLUME);
        this.coupling = new Coupling(spec.fluid(), diameter, state -> flowAt(state).pick()
                .map(r -> r.trial().value()).orElse(Double.NaN));
    }

    /** @throws CaseRefusedException when no candidate can be computed */
    public CaseResult solve() {
        if (powers.isEmpty() || constants.isEmpty()) {
            throw new CaseRefusedException("family", family.id(), "has no installed correlation for the "
                    + (powers.isEmpty() ? Quantity.POWER_NUMBER : Quantity.SHEAR_RATE_CONSTANT).title());
        }
        List<PowerTrial> trials = powers.stream().map(this::tryPower).toList();
        Selection selection = Selection.of(trials.stream().map(PowerTrial::trial).toList(),
                spec.choices().correlation(Quantity.POWER_NUMBER), Optional.empty());
        Selection.Ranked pick = selection.pick().filter(p -> p.trial().usable())
                .orElseThrow(() -> nothingComputed(selection));
        return new ResultAssembly(spec, family, vessel, pick).assemble(
                selection.ranked().stream().map(r -> row(trials, r)).toList(), further(pick));
    }

    /** Every other quantity, each correlation at the pick's state with the pick's power and flow number. */
    private List<Selection> further(Selection.Ranked pick) {
        FluidState state = pick.trial().state().orElseThrow();
        List<Selection> selections = new ArrayList<>();
        for (Quantity quantity : candidates.furtherQuantities()) {
            List<Trial> trials = new ArrayList<>();
            for (Candidate candidate : candidates.of(quantity)) {
                Point point = new Point().at(state).set(Variable.POWER_NUMBER, pick.trial().value());
                flowAt(state).pick().ifPresent(flow -> point.set(Variable.FLOW_NUMBER, flow.trial().value()));
                trials.add(trial(candidate, state, point, OptionalDouble.empty()));
            }
            selections.add(Selection.of(trials, spec.choices().correlation(quantity), Optional.empty()));
        }
        return selections;
    }

    /** A power candidate and the shear-rate constants that were tried for it. */
    private record PowerTrial(Trial trial, Selection constants) {}

    private ResultAssembly.Row row(List<PowerTrial> trials, Selection.Ranked ranked) {
        Selection selected = trials.stream()
                .filter(t -> t.trial() == ranked.trial()).findFirst().orElseThrow().constants();
        Selection flow = ranked.trial().state().map(this::flowAt).orElse(Selection.NONE);
        return new ResultAssembly.Row(ranked, selected, flow);
    }

    private PowerTrial tryPower(Candidate power) {
        Optional<String> belonging = power.correlation().flatMap(Correlation::belongsWith);
        Selection selected = Selection.of(
                constantsFor(power), spec.choices().correlation(Quantity.SHEAR_RATE_CONSTANT), belonging);
        Optional<FluidState> state = selected.pick().flatMap(r -> r.trial().state());
        if (state.isEmpty()) {
            String reason = selected.ranked().get(0).trial().assessment().obstacle();
            return new PowerTrial(without(power, reason), selected);
        }
        return new PowerTrial(trial(power, state.get(), OptionalDouble.empty()), selected);
    }

    /** The shear-rate constants at their own states; shared unless the speed depends on the power. */
    private List<Trial> constantsFor(Candidate power) {
        if (spec.speed() instanceof SpeedDemand.ForPowerPerVolume demand) {
            return constants.stream().map(c -> tryConstant(c, speedForPower(demand, power, c))).toList();
        }
        if (sharedConstants.isEmpty()) {
            sharedConstants = Optional.of(constants.stream().map(c -> tryConstant(c, speedFor(c))).toList());
        }
        return sharedConstants.get();
    }

    private Trial tryConstant(Candidate constant, Solution solution) {
        return solution.state()
                .map(s -> trial(constant, s, OptionalDouble.of(s.shearRateConstant())))
                .orElseGet(() -> without(constant, solution.failure()));
    }

    private Solution speedFor(Candidate constant) {
        return switch (spec.speed()) {
            case SpeedDemand.At at -> coupling.at(at.value(), constant);
            case SpeedDemand.ForTipSpeed tip -> coupling.at(tip.value() / (Math.PI * diameter), constant);
            case SpeedDemand.ForShearRate shear -> coupling.forShearRate(shear, constant);
            case SpeedDemand.ForPowerPerVolume power -> throw new IllegalStateException("depends on the power: " + power);
        };
    }

    private Solution speedForPower(SpeedDemand.ForPowerPerVolume demand, Candidate power, Candidate constant) {
        Point point = new Point();
        UnivariateFunction gap = lnSpeed -> coupling.at(Math.exp(lnSpeed), constant).state()
                .map(s -> Math.log(s.power(power.value(point.at(s), s)) / volume / demand.value()))
                .orElse(Double.NaN);
        double root = Roots.least(gap, Roots.leastLnSpeed(), Roots.mostLnSpeed(diameter), Coupling.TOLERANCE);
        return Double.isNaN(root) ? Solution.failed(Roots.noSpeed(demand)) : coupling.at(Math.exp(root), constant);
    }

    /** Evaluates and assesses a candidate at a state, unless its value is known already. */
    private Trial trial(Candidate candidate, FluidState state, OptionalDouble known) {
        Point point = new Point().at(state);
        if (candidate.reads(Variable.FLOW_NUMBER)) {
            flowAt(state).pick().ifPresent(flow -> point.set(Variable.FLOW_NUMBER, flow.trial().value()));
        }
        return trial(candidate, state, point, known);
    }

    private static Trial trial(Candidate candidate, FluidState state, Point point, OptionalDouble known) {
        double value = known.orElseGet(() -> candidate.value(point, state));
        return new Trial(candidate, Optional.of(state), value, Assessment.of(candidate, point, state, value));
    }

    private static Trial without(Candidate candidate, String reason) {
        return new Trial(candidate, Optional.empty(), Double.NaN, Assessment.impossible(reason));
    }

    private Selection flowAt(FluidState state) {
        return flowsByState.computeIfAbsent(state, s -> Selection.of(
                flows.stream().map(flow -> trial(flow, s, OptionalDouble.empty())).toList(),
                spec.choices().correlation(Quantity.FLOW_NUMBER), Optional.empty()));
    }

    private CaseRefusedException nothingComputed(Selection selection) {
        Selection.Ranked first = selection.ranked().get(0);
        return new CaseRefusedException(spec.speed().field(), String.valueOf(spec.speed().value()),
                "cannot be met: " + first.trial().assessment().obstacle());
    }
}
