package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import stirwright.exchange.CurveBlock;
import stirwright.exchange.Measurement;
import stirwright.exchange.Ramp;

/** A label for each curve that no other one of its source has. */
final class CurveNames {
    private final String stem;
    private final boolean several;
    private final boolean severalTemperatures;
    private final Map<String, Integer> used = new HashMap<>();

    /** @param taken the blocks that become curves */
    CurveNames(String stem, List<CurveBlock> taken) {
        this.stem = stem;
        this.several = taken.size() > 1;
        this.severalTemperatures = taken.stream()
                .anyMatch(b -> !Measurement.sameTemperature(b.temperature(), taken.get(0).temperature()));
    }

    /** @param sample what tells its sample from others of the source; may be empty */
    String next(CurveBlock block, Part part, String sample) {
        String own = part.stretch().heads.own();
        return unique(!own.isEmpty() ? own : several ? words(block, part, sample) : stem);
    }

    private String words(CurveBlock block, Part part, String told) {
        List<String> words = new ArrayList<>(List.of(stem));
        String sample = part.sample().isEmpty() && !told.equals(block.sheet()) ? told : part.sample();
        if (!sample.isEmpty()) {
            words.add(sample);
        } else if (block.sample() > 1 || part.stretch().layout.groups().size() > 1) {
            words.add("sample " + block.sample());
        }
        if (!block.sheet().isEmpty()) {
            words.add(block.sheet());
        }
        if (severalTemperatures && !Double.isNaN(block.temperature())) {
            words.add(Math.round(block.temperature()) + " degC");
        }
        if (block.use().ramp() != Ramp.NONE) {
            words.add(block.use().ramp().word());
        }
        if (block.replicate() > 1) {
            words.add("replicate " + block.replicate());
        }
        return String.join(" ", words);
    }

    private String unique(String label) {
        int count = used.merge(label, 1, Integer::sum);
        return count == 1 ? label : unique(label + " (" + count + ")");
    }
}
