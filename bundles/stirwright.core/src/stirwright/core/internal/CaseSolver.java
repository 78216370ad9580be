package stirwright.core.internal;

import java.util.ArrayList;
import java.util.HashMap;
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
import stirwright.core.Choices;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.core.Role;
import stirwright.core.Slice;
import stirwright.core.SpeedDemand;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Correlation;
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
    /** Power goes with the second to third power of speed. */
    private static final double POWER_OVER_SPEED = 2.5;

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
    /** By the constant that a power correlation belongs with. */
    private final Map<Optional<String>, Selection> sharedConstants = new HashMap<>();

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
        this.coupling = new Coupling(spec.fluid(), diameter, this::flowNumber);
        checkSpeed(spec.speed());
    }

    private void checkSpeed(SpeedDemand demand) {
        double tipSpeed = switch (demand) {
            case SpeedDemand.At at -> Math.PI * diameter * at.value();
            case SpeedDemand.ForTipSpeed tip -> tip.value();
            case SpeedDemand.ForShearRate shear -> 0;
            case SpeedDemand.ForPowerPerVolume power -> 0;
        };
        if (tipSpeed > SpeedDemand.MOST_TIP_SPEED) {
            throw new CaseRefusedException(demand.field(), Figures.show(demand.value()), "gives a tip speed above "
                    + Figures.show(SpeedDemand.MOST_TIP_SPEED) + " m/s; was a unit mistaken");
        }
        if (demand instanceof SpeedDemand.At at && at.value() < SpeedDemand.LEAST_SPEED) {
            throw new CaseRefusedException(demand.field(), Figures.show(demand.value()), "is below "
                    + Figures.show(SpeedDemand.LEAST_SPEED) + " rev/s");
        }
    }

    /** @throws CaseRefusedException when no candidate can be computed */
    public CaseResult solve() {
        List<PowerTrial> trials = powerTrials();
        Selection selection = selectPower(trials);
        Selection.Ranked pick = usablePick(selection);
        return new ResultAssembly(spec, family, vessel, pick).assemble(
                selection.ranked().stream().map(r -> row(trials, r)).toList(), further(pick));
    }

    /** @throws CaseRefusedException when the case has no pick or no such candidate */
    public Slice slice(Quantity quantity, String correlationId, Variable over) {
        Selection.Ranked pick = usablePick(selectPower(powerTrials()));
        FluidState state = pick.trial().state().orElseThrow();
        Candidate candidate = candidates.of(quantity).stream().filter(c -> c.id().equals(correlationId)).findFirst()
                .orElseThrow(() -> new CaseRefusedException(Choices.field(quantity), correlationId,
                        "is not a candidate for the " + quantity.title() + " of family " + family.id()));
        return new CandidateSlice(candidate, state, pointFor(candidate, state, pick), over);
    }

    private List<PowerTrial> powerTrials() {
        if (powers.isEmpty() || constants.isEmpty()) {
            Quantity missing = powers.isEmpty() ? Quantity.POWER_NUMBER : Quantity.SHEAR_RATE_CONSTANT;
            throw new CaseRefusedException("family", family.id(), "has no installed correlation for the "
                    + missing.title() + "; give a value in the column " + missing.id().replace('-', '_'));
        }
        return powers.stream().map(this::tryPower).toList();
    }

    private Selection selectPower(List<PowerTrial> trials) {
        return Selection.of(trials.stream().map(PowerTrial::trial).toList(),
                spec.choices().correlation(Quantity.POWER_NUMBER), Optional.empty());
    }

    private Selection.Ranked usablePick(Selection selection) {
        return selection.pick().filter(p -> p.trial().usable()).orElseThrow(() -> nothingComputed(selection));
    }

    /** Every other quantity, each correlation at the pick's state with the pick's power and flow number. */
    private List<Selection> further(Selection.Ranked pick) {
        FluidState state = pick.trial().state().orElseThrow();
        List<Selection> selections = new ArrayList<>();
        for (Quantity quantity : candidates.furtherQuantities()) {
            List<Trial> trials = new ArrayList<>();
            for (Candidate candidate : candidates.of(quantity)) {
                trials.add(trial(candidate, state, pointFor(candidate, state, pick), OptionalDouble.empty()));
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
        Selection selected = spec.speed() instanceof SpeedDemand.ForPowerPerVolume demand
                ? selectConstant(solveForPower(demand, power), belonging)
                : sharedConstants.computeIfAbsent(belonging, b -> selectConstant(solveForSpeed(), b));
        Optional<FluidState> state = selected.pick().flatMap(r -> r.trial().state());
        if (state.isEmpty()) {
            String reason = selected.ranked().get(0).trial().assessment().obstacle();
            return new PowerTrial(without(power, reason), selected);
        }
        return new PowerTrial(trial(power, state.get(), OptionalDouble.empty()), selected);
    }

    private Selection selectConstant(List<Trial> trials, Optional<String> belonging) {
        return Selection.of(trials, spec.choices().correlation(Quantity.SHEAR_RATE_CONSTANT), belonging);
    }

    /** The shear-rate constants at their own states, whatever the power. */
    private List<Trial> solveForSpeed() {
        return constants.stream().map(c -> tryConstant(c, speedFor(c))).toList();
    }

    /** The same where the speed depends on the power. */
    private List<Trial> solveForPower(SpeedDemand.ForPowerPerVolume demand, Candidate power) {
        // Where a power number of 1 would meet it.
        double near = Math.cbrt(demand.value() * volume / (spec.fluid().density() * Math.pow(diameter, 5)));
        List<Trial> trials = new ArrayList<>();
        for (Candidate constant : constants) {
            Solution solution = speedForPower(demand, power, constant, near);
            near = solution.state().map(FluidState::speed).orElse(near);
            trials.add(tryConstant(constant, solution));
        }
        return trials;
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

    /** @param near a speed to start from */
    private Solution speedForPower(
            SpeedDemand.ForPowerPerVolume demand, Candidate power, Candidate constant, double near) {
        Solution slowest = coupling.at(SpeedDemand.LEAST_SPEED, constant);
        if (slowest.state().isEmpty()) {
            return slowest;
        }
        Point point = new Point();
        UnivariateFunction gap = lnSpeed -> coupling.at(Math.exp(lnSpeed), constant).state()
                .map(s -> Math.log(s.power(power.value(setUp(point, power, s), s)) / volume / demand.value()))
                .orElse(Double.NaN);
        double root = Roots.bySecants(gap, Math.log(near), POWER_OVER_SPEED, Coupling.TOLERANCE);
        if (!(root >= Roots.leastLnSpeed() && root <= Roots.mostLnSpeed(diameter))) {
            root = Roots.least(gap, Roots.leastLnSpeed(), Roots.mostLnSpeed(diameter), Coupling.TOLERANCE);
        }
        return Double.isNaN(root) ? Solution.failed(Roots.noSpeed(demand)) : coupling.at(Math.exp(root), constant);
    }

    /** Evaluates and assesses a candidate at a state, unless its value is known already. */
    private Trial trial(Candidate candidate, FluidState state, OptionalDouble known) {
        return trial(candidate, state, pointFor(candidate, state), known);
    }

    private static Trial trial(Candidate candidate, FluidState state, Point point, OptionalDouble known) {
        double value = known.orElseGet(() -> candidate.value(point, state));
        return new Trial(candidate, Optional.of(state), value, Assessment.of(candidate, point, state, value));
    }

    private static Trial without(Candidate candidate, String reason) {
        return new Trial(candidate, Optional.empty(), Double.NaN, Assessment.impossible(reason));
    }

    /** The state as an operating point, with the flow number where a candidate reads it. */
    private Point pointFor(Candidate candidate, FluidState state) {
        return setUp(new Point(), candidate, state);
    }

    private Point setUp(Point point, Candidate candidate, FluidState state) {
        point.at(state);
        boolean itself = candidate.quantity().equals(Quantity.FLOW_NUMBER);
        return candidate.reads().contains(Variable.FLOW_NUMBER) && !itself
                ? point.set(Variable.FLOW_NUMBER, flowNumber(state)) : point;
    }

    /** The same once there is a pick: its power number is known too. */
    private Point pointFor(Candidate candidate, FluidState state, Selection.Ranked pick) {
        boolean itself = candidate.quantity().equals(Quantity.POWER_NUMBER);
        Point point = pointFor(candidate, state);
        return itself ? point : point.set(Variable.POWER_NUMBER, pick.trial().value());
    }

    /** The pick's flow number at a state that may be one of many on the way to a solution. */
    private double flowNumber(FluidState state) {
        return selectFlow(state).pick().map(r -> r.trial().value()).orElse(Double.NaN);
    }

    /** The flow numbers at a state that stays; asked for by each power candidate at it. */
    private Selection flowAt(FluidState state) {
        return flowsByState.computeIfAbsent(state, this::selectFlow);
    }

    private Selection selectFlow(FluidState state) {
        return Selection.of(flows.stream().map(flow -> trial(flow, state, OptionalDouble.empty())).toList(),
                spec.choices().correlation(Quantity.FLOW_NUMBER), Optional.empty());
    }

    /** Nothing has a number, or the correlation that the case asks for has none. */
    private CaseRefusedException nothingComputed(Selection selection) {
        Selection.Ranked first = selection.ranked().get(0);
        String obstacle = first.trial().assessment().obstacle();
        return first.role() == Role.CHOSEN
                ? new CaseRefusedException(Choices.field(Quantity.POWER_NUMBER), first.id(), "gives no power: " + obstacle)
                : new CaseRefusedException(spec.speed().field(), Figures.show(spec.speed().value()),
                        "leads to no power: " + obstacle);
    }
}
