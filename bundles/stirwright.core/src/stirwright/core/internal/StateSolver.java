package stirwright.core.internal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.DoubleFunction;
import java.util.function.ToDoubleFunction;
import stirwright.core.CaseRefusedException;
import stirwright.core.CaseSpec;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.core.SpeedDemand;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Figures;
import stirwright.correlation.Quantity;

/**
 * Finds the state of the product for each shear-rate constant: at the speed of the case, or at the
 * speed that meets its target. Not thread-safe.
 */
final class StateSolver {
    /** Power goes with the second to third power of speed. */
    private static final double POWER_OVER_SPEED = 2.5;

    private final CaseSpec spec;
    private final List<Candidate> constants;
    private final Trials trials;
    private final Coupling coupling;
    private final double diameter;
    private final double volume;
    /** Where the speed does not depend on the power: by the constant that a power correlation belongs with. */
    private final Map<Optional<String>, Selection> shared = new HashMap<>();
    private final Map<Optional<String>, Selection> sharedAll = new HashMap<>();

    /** @throws CaseRefusedException when the speed or the tip speed is beyond its limits */
    StateSolver(CaseSpec spec, VesselGeometry vessel, List<Candidate> constants, Trials trials) {
        this.spec = spec;
        this.constants = constants.stream().sorted(Comparator.comparing(Ranking::isCommonPractice)).toList();
        this.trials = trials;
        this.diameter = vessel.get(Dimensions.IMPELLER_DIAMETER);
        this.volume = vessel.get(Dimensions.LIQUID_VOLUME);
        this.coupling = new Coupling(spec.fluid(), diameter, trials);
        checkSpeed(spec.speed());
    }

    private void checkSpeed(SpeedDemand demand) {
        double speed = switch (demand) {
            case SpeedDemand.At at -> at.value();
            case SpeedDemand.ForTipSpeed tip -> tip.value() / (Math.PI * diameter);
            case SpeedDemand.ForShearRate shear -> SpeedDemand.LEAST_SPEED;
            case SpeedDemand.ForPowerPerVolume power -> SpeedDemand.LEAST_SPEED;
        };
        if (Math.PI * diameter * speed > SpeedDemand.MOST_TIP_SPEED) {
            throw new CaseRefusedException(demand.field(), Figures.show(demand.value()), "gives a tip speed above "
                    + Figures.show(SpeedDemand.MOST_TIP_SPEED) + " m/s; was a unit mistaken");
        }
        if (speed < SpeedDemand.LEAST_SPEED) {
            throw new CaseRefusedException(demand.field(), Figures.show(demand.value()), "is a speed below "
                    + Figures.show(SpeedDemand.LEAST_SPEED) + " rev/s");
        }
    }

    /** The constants as far as the pick for a power candidate needs them, each at its own state. */
    Selection forPick(Candidate power) {
        Optional<String> belonging = power.correlation().flatMap(Correlation::belongsWith);
        boolean firstWillDo = belonging.isEmpty() && spec.choices().correlation(Quantity.SHEAR_RATE_CONSTANT).isEmpty();
        return spec.speed() instanceof SpeedDemand.ForPowerPerVolume demand
                ? select(solveForPower(demand, power, firstWillDo), belonging)
                : shared.computeIfAbsent(belonging, b -> select(solveForSpeed(firstWillDo), b));
    }

    /** All constants for a power candidate. */
    Selection all(Candidate power) {
        Optional<String> belonging = power.correlation().flatMap(Correlation::belongsWith);
        return spec.speed() instanceof SpeedDemand.ForPowerPerVolume demand
                ? select(solveForPower(demand, power, false), belonging)
                : sharedAll.computeIfAbsent(belonging, b -> select(solveForSpeed(false), b));
    }

    /** The id of the constant that the case chooses, where it has no value at the speed of the case or, for a target, at 1 rev/s. */
    Optional<String> chosenWithoutValue() {
        double speed = switch (spec.speed()) {
            case SpeedDemand.At at -> at.value();
            case SpeedDemand.ForTipSpeed tip -> tip.value() / (Math.PI * diameter);
            case SpeedDemand.ForShearRate shear -> 1;
            case SpeedDemand.ForPowerPerVolume power -> 1;
        };
        return spec.choices().correlation(Quantity.SHEAR_RATE_CONSTANT).filter(id -> constants.stream()
                .anyMatch(c -> c.id().equals(id) && !coupling.hasValue(speed, c)));
    }

    private Selection select(List<Trial> solved, Optional<String> belonging) {
        return Selection.of(solved, spec.choices().correlation(Quantity.SHEAR_RATE_CONSTANT), belonging);
    }

    private List<Trial> solveForSpeed(boolean pickWillDo) {
        List<Trial> solved = new ArrayList<>();
        for (Candidate constant : constants) {
            if (pickWillDo && isIdle(constant, solved)) {
                break;
            }
            solved.add(tried(constant, atSpeed(constant)));
        }
        return solved;
    }

    /**
     * A rule of the trade comes last and is not picked where anything published has a number. Nor does it stand in
     * where that has none because nothing meets the target: with a power law that cannot reach it, no constant helps.
     */
    private static boolean isIdle(Candidate constant, List<Trial> solved) {
        return Ranking.isCommonPractice(constant) && !solved.isEmpty();
    }

    private Solution atSpeed(Candidate constant) {
        return switch (spec.speed()) {
            case SpeedDemand.At at -> coupling.at(at.value(), constant);
            case SpeedDemand.ForTipSpeed tip -> coupling.at(tip.value() / (Math.PI * diameter), constant);
            case SpeedDemand.ForShearRate shear -> coupling.forShearRate(shear, constant);
            case SpeedDemand.ForPowerPerVolume power -> throw new IllegalStateException("depends on the power: " + power);
        };
    }

    /** @param firstWillDo whether to stop where no later one can become the pick: they come in the order of trust */
    private List<Trial> solveForPower(SpeedDemand.ForPowerPerVolume demand, Candidate power, boolean firstWillDo) {
        // Where a power number of 1 would meet it.
        double near = Math.cbrt(demand.value() * volume / (spec.fluid().density() * Math.pow(diameter, 5)));
        List<Trial> solved = new ArrayList<>();
        for (Candidate constant : constants) {
            if (firstWillDo && isIdle(constant, solved)) {
                break;
            }
            Solution solution = guarded(demand, power, constant, near);
            near = solution.state().map(FluidState::speed).orElse(near);
            solved.add(tried(constant, solution));
            if (firstWillDo && settled(solved.getLast(), constants.subList(solved.size(), constants.size()))) {
                break;
            }
        }
        return solved;
    }

    /** A later one comes before this one only if it qualifies and this one does not, or if it is nearer. */
    private static boolean settled(Trial trial, List<Candidate> later) {
        return trial.qualifies() || trial.isNearest() && later.stream().noneMatch(c -> c.distrust().isEmpty());
    }

    /** Guards the power number's code once for all the steps to a solution, which are many. */
    private Solution guarded(SpeedDemand.ForPowerPerVolume demand, Candidate power, Candidate constant, double near) {
        Optional<Solution> solution = power.foreign().call(
                () -> Optional.of(forPower(demand, power, constant, near)), Optional.empty());
        return solution.orElseGet(() -> Solution.failed(
                "the power number's code fails: " + power.foreign().failure()));
    }

    /** @param near a speed to start from */
    private Solution forPower(SpeedDemand.ForPowerPerVolume demand, Candidate power, Candidate constant, double near) {
        Point point = new Point();
        ToDoubleFunction<Solution> gap = solution -> solution.state()
                .map(s -> Math.log(s.power(power.product(trials.setUp(point, s, power), s, s.reynolds()))
                        / volume / demand.value()))
                .orElse(Double.NaN);
        // By the shear rate where the fluid follows from it, which spares the inner loop.
        DoubleFunction<Solution> state = Coupling.followsFromShearRate(constant)
                ? ln -> coupling.atShearRate(Math.exp(ln), constant) : ln -> coupling.at(Math.exp(ln), constant);
        double start = Coupling.followsFromShearRate(constant) ? near * Coupling.FIRST_GUESS : near;
        double root = Roots.bySecants(ln -> gap.applyAsDouble(state.apply(ln)), Math.log(start), POWER_OVER_SPEED,
                Coupling.TOLERANCE);
        Solution found = Double.isNaN(root) ? Solution.failed("") : state.apply(root);
        return found.state().filter(x -> Roots.withinLimits(x.speed(), diameter)).isPresent() ? found : scanned(demand, constant, gap);
    }

    /** For powers that do not rise steadily with speed. */
    private Solution scanned(
            SpeedDemand.ForPowerPerVolume demand, Candidate constant, ToDoubleFunction<Solution> gap) {
        Solution slowest = coupling.at(SpeedDemand.LEAST_SPEED, constant);
        if (slowest.state().isEmpty()) {
            return slowest;
        }
        double root = Roots.least(ln -> gap.applyAsDouble(coupling.at(Math.exp(ln), constant)),
                Roots.leastLnSpeed(), Roots.mostLnSpeed(diameter), Coupling.TOLERANCE);
        return Double.isNaN(root) ? Solution.failed(Roots.noSpeed(demand)) : coupling.at(Math.exp(root), constant);
    }

    private Trial tried(Candidate constant, Solution solution) {
        return solution.state()
                .map(s -> trials.at(s, constant, s.shearRateConstant()))
                .orElseGet(() -> Trials.nowhere(constant, solution.failure()));
    }
}
