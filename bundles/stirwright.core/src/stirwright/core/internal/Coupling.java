package stirwright.core.internal;

import java.util.function.ToDoubleFunction;
import org.apache.commons.math3.analysis.UnivariateFunction;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.core.SpeedDemand;
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
    private static final double FIRST_GUESS = 10;
    private static final double LEAST_CONSTANT = 1e-3;
    private static final double MOST_CONSTANT = 1e5;
    /** A flow index within this of 1 is a constant viscosity. */
    private static final double NEWTONIAN = 1e-9;

    private final Fluid fluid;
    private final double diameter;
    private final ToDoubleFunction<FluidState> flowNumber;
    private final Point point = new Point();

    /** @param flowNumber the flow number to use at a state, for constants that depend on it */
    Coupling(Fluid fluid, double diameter, ToDoubleFunction<FluidState> flowNumber) {
        this.fluid = fluid;
        this.diameter = diameter;
        this.flowNumber = flowNumber;
    }

    /** The state at a speed in rev/s. */
    Solution at(double speed, Candidate constant) {
        if (constant.readsNothing()) {
            return finished(speed, evaluate(constant, state(speed, FIRST_GUESS)));
        }
        double current = FIRST_GUESS;
        for (int step = 0; step < STEPS; step++) {
            double next = evaluate(constant, state(speed, current));
            if (!usable(next)) {
                break;
            }
            if (Math.abs(next - current) <= TOLERANCE * next) {
                return finished(speed, next);
            }
            current = next;
        }
        UnivariateFunction gap = ln -> Math.log(evaluate(constant, state(speed, Math.exp(ln)))) - ln;
        double root = Roots.least(gap, Math.log(LEAST_CONSTANT), Math.log(MOST_CONSTANT), TOLERANCE);
        return Double.isNaN(root)
                ? Solution.failed("the loop between shear rate and shear-rate constant does not converge to "
                        + TOLERANCE + " after " + STEPS + " steps and a search from " + LEAST_CONSTANT
                        + " to " + MOST_CONSTANT)
                : finished(speed, Math.exp(root));
    }

    /** The state at the least speed that gives an average shear rate in 1/s. */
    Solution forShearRate(SpeedDemand.ForShearRate demand, Candidate constant) {
        double shearRate = demand.value();
        if (constant.readsNothing()) {
            double value = evaluate(constant, state(1, FIRST_GUESS));
            return usable(value) ? at(shearRate / value, constant) : finished(1, value);
        }
        // At a known shear rate the fluid is known; only the speed is not.
        UnivariateFunction gap = ln -> {
            double speed = Math.exp(ln);
            return Math.log(evaluate(constant, state(speed, shearRate / speed)) * speed / shearRate);
        };
        double root = Roots.least(gap, Roots.leastLnSpeed(), Roots.mostLnSpeed(diameter), TOLERANCE);
        return Double.isNaN(root) ? Solution.failed(Roots.noSpeed(demand)) : at(Math.exp(root), constant);
    }

    private double evaluate(Candidate constant, FluidState state) {
        point.at(state);
        if (constant.reads(Variable.FLOW_NUMBER)) {
            point.set(Variable.FLOW_NUMBER, flowNumber.applyAsDouble(state));
        }
        return constant.value(point, state);
    }

    private Solution finished(double speed, double constant) {
        return usable(constant)
                ? Solution.found(state(speed, constant))
                : Solution.failed("the shear-rate constant has no positive value here");
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
