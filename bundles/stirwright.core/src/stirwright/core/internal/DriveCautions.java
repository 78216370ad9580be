package stirwright.core.internal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.correlation.Figures;

/** Where a drive that is sized by the pick's power could turn out too small. */
final class DriveCautions {

    /** Common practice, no source: sources that agree within a tenth agree. */
    private static final double AGREED = 1.1;

    private DriveCautions() {}

    /** @param rows the pick first */
    static List<String> of(List<ResultAssembly.Row> rows) {
        List<String> cautions = new ArrayList<>();
        Selection.Ranked pick = rows.get(0).power();
        double used = power(pick);
        greatest(rows).filter(r -> power(r) > AGREED * used).ifPresent(r -> cautions.add(String.format(Locale.ROOT,
                "caution: %s qualifies too and has %.0f %% more power; what is sized for power or torque must bear the highest that"
                        + " can be expected, as the equipment maker and licensed practice judge", r.id(),
                100 * (power(r) / used - 1))));
        FluidState state = pick.trial().state().orElseThrow();
        pick.trial().candidate().factors(new Point().at(state), state).stream()
                .filter(f -> !f.leftOut() && f.value() < 1)
                .forEach(f -> cautions.add("caution: the factor for " + f.effect().title() + ", " + Figures.show(f.value())
                        + ", lowers the power; where it may not act, what is sized for power or torque must bear the power without"
                        + " it"));
        return cautions;
    }

    private static Optional<Selection.Ranked> greatest(List<ResultAssembly.Row> rows) {
        return rows.stream().map(ResultAssembly.Row::power).filter(r -> r.trial().qualifies())
                .max(Comparator.comparingDouble(DriveCautions::power));
    }

    private static double power(Selection.Ranked ranked) {
        return ranked.trial().state().map(s -> s.power(ranked.trial().value())).orElse(Double.NaN);
    }
}
