package stirwright.core.internal;

import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import stirwright.core.SpeedDemand;
import stirwright.correlation.Figures;

/** The least root of a function on an interval, and the interval in which speeds are sought. */
final class Roots {

    /** Common practice, no source: one turn in three hours; no agitator runs slower. */
    private static final double LEAST_SPEED = 1e-4;

    /** Common practice, no source: m/s; toothed discs stay below half of it. */
    private static final double MOST_TIP_SPEED = 100;

    private static final int SECTIONS = 56;
    private static final int MAX_EVALUATIONS = 200;

    private Roots() {}

    static double leastLnSpeed() {
        return Math.log(LEAST_SPEED);
    }

    static double mostLnSpeed(double diameter) {
        return Math.log(MOST_TIP_SPEED / (Math.PI * diameter));
    }

    static String noSpeed(SpeedDemand demand) {
        return "no speed from " + LEAST_SPEED + " rev/s to a tip speed of " + Figures.show(MOST_TIP_SPEED)
                + " m/s meets " + demand.field() + " " + Figures.show(demand.value());
    }

    /**
     * Scans upward in equal sections for the first change of sign, then narrows it down.
     *
     * @param tolerance on the argument
     * @return NaN when there is no change of sign, or only a jump
     */
    static double least(UnivariateFunction function, double from, double to, double tolerance) {
        double left = from;
        double atLeft = function.value(left);
        for (int i = 1; i <= SECTIONS; i++) {
            double right = from + (to - from) * i / SECTIONS;
            double atRight = function.value(right);
            if (atLeft == 0) {
                return left;
            }
            if (atLeft * atRight <= 0) {
                double root = new BrentSolver(tolerance / 10, tolerance / 10, 0)
                        .solve(MAX_EVALUATIONS, function, left, right);
                return Math.abs(function.value(root)) <= Math.sqrt(tolerance) ? root : Double.NaN;
            }
            left = right;
            atLeft = atRight;
        }
        return Double.NaN;
    }
}
