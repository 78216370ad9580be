package stirwright.core.internal;

import java.util.Set;
import org.apache.commons.math3.analysis.UnivariateFunction;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.core.SpeedDemand;
import stirwright.correlation.Figures;
import stirwright.correlation.FluidClass;
import stirwright.correlation.Variable;
import stirwright.rheology.Fluid;

/**
 * Couples a fluid to a shear-rate constant: shear rate, apparent viscosity and Reynolds number at a
 * speed, also when the constant itself depends on the flow index, the Reynolds number or the flow
 * number. Not thread-safe.
 */
final class Coupling {

    /** A loop has converged when the constant changes by less than this share of itself. */
    static final double TOLERANCE = 1e-12;

    private static final int STEPS = 100;
    /** Most published constants are about that. */
    static final double FIRST_GUESS = 10;
    private static final double LEAST_CONSTANT = 1e-3;
    private static final double MOST_CONSTANT = 1e5;
    /** Pa s. Common practice, no source: gases lie above, and nothing that is stirred beyond. */
    private static final double LEAST_VISCOSITY = 1e-6;
    private static final double MOST_VISCOSITY = 1e9;
    /** A flow index within this of 1 is a constant viscosity. */
    private static final double NEWTONIAN = 1e-9;

    /** What is known of the product as soon as the shear rate is, whatever the speed. */
    private static final Set<Variable> BY_SHEAR_RATE_ALONE =
            Set.of(Variable.FLOW_INDEX, Variable.VISCOSITY, Variable.DENSITY, Variable.LAMINAR_POWER);

    private final Fluid fluid;
    private final double diameter;
    private final Trials trials;
    private final Point point = new Point();

    /** @param trials what else is known at a state, for constants that depend on it */
    Coupling(Fluid fluid, double diameter, Trials trials) {
        this.fluid = fluid;
        this.diameter = diameter;
        this.trials = trials;
    }

    /** The state at a speed in rev/s. */
    Solution at(double speed, Candidate constant) {
        if (constant.reads().isEmpty()) {
            return finished(speed, evaluate(constant, state(speed, FIRST_GUESS)), constant);
        }
        double current = FIRST_GUESS;
        for (int step = 0; step < STEPS; step++) {
            double next = evaluate(constant, state(speed, current));
            if (!usable(next)) {
                return step == 0 ? finished(speed, next, constant) : search(speed, constant);
            }
            if (Math.abs(next - current) <= TOLERANCE * next) {
                return finished(speed, next, constant);
            }
            current = next;
        }
        return search(speed, constant);
    }

    /** Whether a constant has a value where the loop at a speed in rev/s begins. */
    boolean hasValue(double speed, Candidate constant) {
        return usable(evaluate(constant, state(speed, FIRST_GUESS)));
    }

    /** For loops that plain iteration runs away from. */
    private Solution search(double speed, Candidate constant) {
        UnivariateFunction gap = ln -> Math.log(evaluate(constant, state(speed, Math.exp(ln)))) - ln;
        double root = Roots.least(gap, Math.log(LEAST_CONSTANT), Math.log(MOST_CONSTANT), TOLERANCE);
        return Double.isNaN(root)
                ? Solution.failed("the loop between shear rate and shear-rate constant does not converge to "
                        + TOLERANCE + " after " + STEPS + " steps and a search from " + LEAST_CONSTANT
                        + " to " + MOST_CONSTANT)
                : finished(speed, Math.exp(root), constant);
    }

    /** Whether the constant follows from the shear rate alone, so that no loop is needed from there. */
    static boolean followsFromShearRate(Candidate constant) {
        return BY_SHEAR_RATE_ALONE.containsAll(constant.reads());
    }

    /** The state at an average shear rate in 1/s, for a constant that follows from it. */
    Solution atShearRate(double shearRate, Candidate constant) {
        double value = evaluate(constant, state(1, shearRate));
        return finished(usable(value) ? shearRate / value : 1, value, constant);
    }

    /** The state at the least speed that gives an average shear rate in 1/s. */
    Solution forShearRate(SpeedDemand.ForShearRate demand, Candidate constant) {
        double shearRate = demand.value();
        Solution solution;
        if (followsFromShearRate(constant)) {
            solution = atShearRate(shearRate, constant);
        } else {
            // At a known shear rate the fluid is known; only the speed is not.
            double speed = Math.exp(Roots.least(ln -> {
                double trial = Math.exp(ln);
                return Math.log(evaluate(constant, state(trial, shearRate / trial)) * trial / shearRate);
            }, Roots.leastLnSpeed(), Roots.mostLnSpeed(diameter), TOLERANCE));
            solution = Double.isNaN(speed)
                    ? Solution.failed(Roots.noSpeed(demand)) : finished(speed, shearRate / speed, constant);
        }
        return solution.state().filter(s -> !Roots.withinLimits(s.speed(), diameter)).isPresent()
                ? Solution.failed(Roots.noSpeed(demand)) : solution;
    }

    private double evaluate(Candidate constant, FluidState state) {
        return constant.value(trials.setUp(point, state, constant), state);
    }

    private Solution finished(double speed, double constant, Candidate candidate) {
        FluidState state = state(speed, usable(constant) ? constant : FIRST_GUESS);
        if (usable(constant)) {
            return state.viscosity() >= LEAST_VISCOSITY && state.viscosity() <= MOST_VISCOSITY
                    ? Solution.found(state)
                    : Solution.failed("the apparent viscosity " + Figures.show(state.viscosity()) + " Pa s is not from "
                            + Figures.show(LEAST_VISCOSITY) + " to " + Figures.show(MOST_VISCOSITY) + " Pa s");
        }
        String unknown = Assessment.unknown(candidate, point, state);
        return Solution.failed(!candidate.foreign().failure().isEmpty() ? "its code fails: " + candidate.foreign().failure()
                : unknown.isEmpty() ? "the shear-rate constant has no positive value here" : unknown);
    }

    private static boolean usable(double constant) {
        return constant > 0 && constant < Double.POSITIVE_INFINITY;
    }

    private FluidState state(double speed, double constant) {
        double shearRate = constant * speed;
        double flowIndex = fluid.model().flowIndex(shearRate);
        return new FluidState(speed, constant, shearRate, fluid.model().apparentViscosity(shearRate), flowIndex,
                fluid.density(), diameter, fluid.model().yieldStress(), classOf(flowIndex));
    }

    private FluidClass classOf(double flowIndex) {
        if (fluid.model().yieldStress() > 0) {
            return FluidClass.YIELD_STRESS;
        }
        if (Math.abs(flowIndex - 1) < NEWTONIAN) {
            return FluidClass.NEWTONIAN;
        }
        return flowIndex < 1 ? FluidClass.SHEAR_THINNING : FluidClass.SHEAR_THICKENING;
    }
}
