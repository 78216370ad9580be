package stirwright.core.internal;

import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import stirwright.core.SpeedDemand;
import stirwright.correlation.Figures;

/** The least root of a function on an interval, and the interval in which speeds are sought. */
final class Roots {

    private static final int SECTIONS = 16;
    private static final int SECANTS = 20;
    /** In logarithms of speed: a factor of ten million is no solution of anything. */
    private static final double MOST_STRAY = 16;
    private static final int MAX_EVALUATIONS = 200;

    private Roots() {}

    static double leastLnSpeed() {
        return Math.log(SpeedDemand.LEAST_SPEED);
    }

    static double mostLnSpeed(double diameter) {
        return Math.log(SpeedDemand.MOST_TIP_SPEED / (Math.PI * diameter));
    }

    static boolean withinLimits(double speed, double diameter) {
        return speed >= SpeedDemand.LEAST_SPEED && Math.log(speed) <= mostLnSpeed(diameter);
    }

    static String noSpeed(SpeedDemand demand) {
        return "no speed from " + Figures.show(SpeedDemand.LEAST_SPEED) + " rev/s to a tip speed of " + Figures.show(SpeedDemand.MOST_TIP_SPEED)
                + " m/s meets " + demand.field() + " " + Figures.show(demand.value());
    }

    /**
     * Scans upward in equal sections for the first change of sign, then narrows it down. Two roots
     * within one section (about half a decade of speed) are not told apart.
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
                return between(function, left, right, tolerance);
            }
            left = right;
            atLeft = atRight;
        }
        return Double.NaN;
    }

    /**
     * Follows secants from a start: for functions that rise almost straight, as power does over speed
     * on logarithmic axes, where it takes a handful of evaluations.
     *
     * @param slope about that of the function
     * @return NaN when it does not settle
     */
    static double bySecants(UnivariateFunction function, double start, double slope, double tolerance) {
        double before = start;
        double atBefore = function.value(before);
        double now = before - atBefore / slope;
        for (int step = 0; step < SECANTS && Math.abs(now - start) < MOST_STRAY; step++) {
            double atNow = function.value(now);
            if (Math.abs(now - before) <= tolerance || atNow == 0) {
                return Math.abs(atNow) <= Math.sqrt(tolerance) ? now : Double.NaN;
            }
            double next = now - atNow * (now - before) / (atNow - atBefore);
            before = now;
            atBefore = atNow;
            now = next;
        }
        return Double.NaN;
    }

    private static double between(UnivariateFunction function, double left, double right, double tolerance) {
        double root = new BrentSolver(tolerance / 10, tolerance / 10, 0).solve(MAX_EVALUATIONS, function, left, right);
        return Math.abs(function.value(root)) <= Math.sqrt(tolerance) ? root : Double.NaN;
    }
}
