package stirwright.conformance.internal;

import stirwright.correlation.Bound;
import stirwright.correlation.Correlation;
import stirwright.correlation.Figures;
import stirwright.correlation.Measure;
import stirwright.correlation.Variable;

/** Whether a claimed laminar limit is one: in creeping flow the force is proportional to the speed. */
public final class LaminarLimits {
    private static final double LOW = 1e-2;
    private static final double TOLERANCE = 1e-3;

    private LaminarLimits() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        for (Correlation correlation : workpiece.correlations()) {
            if (correlation.claimsLaminarLimit()) {
                workpiece.trials(correlation).bases().forEach(base -> examine(correlation, base, findings));
            }
        }
    }

    private static void examine(Correlation correlation, Situation base, Findings findings) {
        double low = Math.min(LOW, lowEnd(correlation)) / 10;
        double higher = product(correlation, base, low);
        double lower = product(correlation, base, low / 10);
        if (!(Math.abs(higher / lower - 1) <= TOLERANCE)) {
            findings.add(correlation.id(), "claims a laminar limit, but value times Reynolds number is "
                    + Figures.show(higher) + " at " + Figures.show(low) + " and " + Figures.show(lower) + " at "
                    + Figures.show(low / 10));
        }
    }

    private static double lowEnd(Correlation correlation) {
        return correlation.bound(Measure.REYNOLDS).filter(Bound.Range.class::isInstance).map(Bound.Range.class::cast)
                .map(Bound.Range::least).filter(least -> least > 0).orElse(LOW);
    }

    private static double product(Correlation correlation, Situation base, double reynolds) {
        return reynolds * Outcome.of(correlation, base.with(Variable.REYNOLDS, reynolds)).value();
    }
}
