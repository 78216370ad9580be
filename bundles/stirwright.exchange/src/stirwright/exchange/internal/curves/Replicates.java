package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import stirwright.exchange.BlockUse;
import stirwright.exchange.Measurement;

/** Counts curves of one sample, ramp and temperature. */
final class Replicates {
    private final Map<List<Object>, List<Seen>> seen = new HashMap<>();

    private static final class Seen {
        double temperature;
        int count;
    }

    int next(String name, BlockUse use, double temperature) {
        List<Object> sample = List.of(name, use.ramp());
        List<Seen> all = seen.computeIfAbsent(sample, s -> new ArrayList<>());
        Seen same = all.stream().filter(s -> Measurement.sameTemperature(s.temperature, temperature)).findFirst().orElse(null);
        if (same == null) {
            same = new Seen();
            same.temperature = temperature;
            all.add(same);
        }
        return ++same.count;
    }
}
