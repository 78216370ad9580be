package stirwright.conformance.internal;

import java.util.List;
import stirwright.correlation.Constants;
import stirwright.correlation.Correlation;

/** Whether the constants that people read in the formula are those that the code computes with. */
public final class ConstantsUsed {
    private static final double CHANGE = 0.01;
    private static final double SEEN = 1e-9;

    private ConstantsUsed() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        for (Correlation correlation : workpiece.offer().correlations()) {
            List<Situation> probes = workpiece.trials(correlation).probes();
            Constants constants = correlation.constants();
            for (String name : constants.names()) {
                double value = constants.get(name);
                demandChange(correlation, constants.with(name, value == 0 ? CHANGE : value * (1 + CHANGE)),
                        "constant '" + name + "'", probes, findings);
            }
            for (String name : constants.curveNames()) {
                demandChange(correlation, constants.withCurve(name, curve -> curve.scaled(1 + CHANGE)),
                        "curve '" + name + "'", probes, findings);
            }
        }
    }

    private static void demandChange(
            Correlation correlation, Constants changed, String what, List<Situation> probes, Findings findings) {
        Correlation other = correlation.withConstants(changed);
        if (!probes.isEmpty() && probes.stream().noneMatch(
                s -> Outcome.of(correlation, s).differenceTo(Outcome.of(other, s)) > SEEN)) {
            findings.add(correlation.id(), "the " + what + " is printed in the formula, but a change of 1 % changes no"
                    + " value; take every coefficient from the constants that bind is given");
        }
    }
}
