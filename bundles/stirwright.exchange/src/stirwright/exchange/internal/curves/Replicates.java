package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import stirwright.exchange.BlockUse;

/** Counts curves of one sample, ramp and temperature. */
final class Replicates {
    /** In K; curves farther apart are measured at different temperatures on purpose. */
    private static final double SAME_TEMPERATURE = 2;

    private final Map<List<Object>, List<Seen>> seen = new HashMap<>();

    private static final class Seen {
        double temperature;
        int count;
    }

    int next(Part part, BlockUse use, double temperature) {
        List<Object> sample = List.of(part.sampleName(), use.ramp());
        List<Seen> all = seen.computeIfAbsent(sample, s -> new ArrayList<>());
        Seen same = all.stream().filter(s -> Double.isNaN(s.temperature) == Double.isNaN(temperature)
                && !(Math.abs(s.temperature - temperature) > SAME_TEMPERATURE)).findFirst().orElse(null);
        if (same == null) {
            same = new Seen();
            same.temperature = temperature;
            all.add(same);
        }
        return ++same.count;
    }
}
