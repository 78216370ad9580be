package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.TreeSet;
import stirwright.correlation.Figures;
import stirwright.exchange.CurveQuantity;

/** What speaks against a flow curve, a sentence each. The limits are common practice, no source. */
final class BlockWarnings {
    private static final int FEW = 6;
    private static final double MOST_DRIFT = 0.5;
    private static final double LEAST_TORQUE = 1;
    private static final double MANY_DROPPED = 1.0 / 3;

    private BlockWarnings() {}

    static List<String> of(Part part, StatusWords statuses) {
        List<String> warnings = new ArrayList<>();
        if (part.stretch().layout.groups().size() > 1 && part.stretch().group.column(CurveQuantity.SAMPLE) == null
                && NameWords.of(part.sample()).numberAlone()) {
            warnings.add("its columns are told from others by the number " + part.sample() + " alone: taken for a replicate of one"
                    + " sample; name the samples in the header if they are several");
        }
        RowCheck.of(part).ifPresent(warnings::add);
        long taken = part.points().stream().filter(ReadPoint::taken).count();
        if (taken < FEW) {
            warnings.add("fewer than " + FEW + " points (" + taken + ")");
        }
        double[] rates = part.taken(CurveQuantity.SHEAR_RATE);
        double span = Arrays.stream(rates).max().orElse(1) / Arrays.stream(rates).min().orElse(1);
        if (rates.length > 0 && span < 10 * (1 - 1e-9)) {
            warnings.add(String.format(Locale.ROOT, "less than one decade of shear rate (a factor of %.3g)", span));
        }
        double[] temperatures = part.taken(CurveQuantity.TEMPERATURE);
        double drift = Arrays.stream(temperatures).max().orElse(0) - Arrays.stream(temperatures).min().orElse(0);
        if (drift > MOST_DRIFT) {
            warnings.add(String.format(Locale.ROOT, "the temperature drifts by %.1f degC (more than %.1f)", drift, MOST_DRIFT));
        }
        double[] torques = part.taken(CurveQuantity.TORQUE_PERCENT);
        long low = Arrays.stream(torques).filter(t -> t < LEAST_TORQUE).count();
        if (low > 0) {
            warnings.add(low + " point" + (low == 1 ? " has" : "s have") + " a torque below " + Figures.show(LEAST_TORQUE)
                    + " % of full scale, where instruments are unsure");
        }
        TreeSet<String> strange = new TreeSet<>();
        part.points().stream().filter(ReadPoint::taken).map(p -> p.point().status()).filter(s -> !statuses.isNormal(s)).forEach(strange::add);
        if (!strange.isEmpty()) {
            warnings.add("points with another status than most: " + String.join(", ", strange.stream().limit(5).toList()));
        }
        long dropped = part.points().size() - taken;
        if (dropped > MANY_DROPPED * part.points().size()) {
            warnings.add(dropped + " of " + part.points().size() + " points are dropped");
        }
        return warnings;
    }
}
