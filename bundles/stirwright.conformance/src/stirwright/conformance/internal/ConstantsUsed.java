package stirwright.conformance.internal;

import java.util.List;
import java.util.function.DoubleFunction;
import stirwright.correlation.Constants;
import stirwright.correlation.Correlation;

/** Whether the constants that people read in the formula are computed with, and each is held by a published number. */
public final class ConstantsUsed {
    private static final double SEEN = 1e-9;
    private static final String CHANGED = "-changed";

    private ConstantsUsed() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        for (Correlation correlation : workpiece.correlations()) {
            Constants constants = correlation.constants();
            for (String name : constants.names()) {
                double value = constants.get(name);
                examine(correlation, "constant '" + name + "'", share ->
                        constants.with(name, value == 0 ? share : value * (1 + share)), workpiece, findings);
            }
            for (String name : constants.curveNames()) {
                examine(correlation, "curve '" + name + "'", share ->
                        constants.withCurve(name, curve -> curve.scaled(1 + share)), workpiece, findings);
            }
        }
    }

    private static void examine(Correlation correlation, String what, DoubleFunction<Constants> changed,
            Workpiece workpiece, Findings findings) {
        List<ReferenceRow> rows = workpiece.references().of(correlation);
        DoubleFunction<Correlation> other = share -> correlation.variant(correlation.id() + CHANGED, changed.apply(share));
        boolean missed = rows.stream().anyMatch(row -> row.missedBy(correlation));
        if (rows.isEmpty() || missed || notices(rows, other, 1) && notices(rows, other, -1)) {
            return;
        }
        Correlation far = other.apply(RowKind.CHART.noticed());
        boolean used = workpiece.trials(correlation).probes().stream()
                .anyMatch(s -> Outcome.of(correlation, s).differenceTo(Outcome.of(far, s)) > SEEN);
        findings.add(correlation.id(), "the " + what + (used
                ? " is held by no reference row: none is missed when it changes by 10 % (a row read off a chart: 40 %);"
                        + " add a row in which it weighs, for an exponent one whose base is far from 1"
                : " is printed in the formula, but changing it changes no value; take every coefficient from the"
                        + " constants that bind is given"));
    }

    private static boolean notices(List<ReferenceRow> rows, DoubleFunction<Correlation> other, int sign) {
        return rows.stream().filter(row -> !row.kind().isBanded()).anyMatch(row -> row.missedBy(other.apply(sign * row.kind().noticed())));
    }
}
