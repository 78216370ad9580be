package stirwright.workbench.internal.flow;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import stirwright.correlation.Figures;
import stirwright.rheology.Hysteresis;
import stirwright.workbench.internal.Messages;

/** How far up and down ramps differ, in sentences. */
final class RampWords {

    private RampWords() {}

    static List<String> of(List<Ramps.Pair> pairs, List<NamedRate> rates) {
        List<String> lines = new ArrayList<>();
        for (Ramps.Pair pair : pairs) {
            String where = pairs.size() > 1 ? pair.words() + ": " : "";
            Optional<Hysteresis> between = Hysteresis.between(pair.up(), pair.down());
            between.ifPresentOrElse(h -> {
                lines.add(where + Messages.bind(FlowWords.Ramps_area, Figures.show(h.area()), percent(h.relativeArea())));
                rates.forEach(r -> lines.add(where + at(h, r)));
            }, () -> lines.add(where + FlowWords.Ramps_apart));
        }
        return lines;
    }

    private static String at(Hysteresis hysteresis, NamedRate rate) {
        double ratio = hysteresis.ratioAt(rate.rate());
        return Double.isNaN(ratio)
                ? Messages.bind(FlowWords.Ramps_outside, new Object[] {rate.name(), Figures.show(hysteresis.common().min()),
                    Figures.show(hysteresis.common().max())})
                : Messages.bind(FlowWords.Ramps_ratio, rate.name(), Figures.show(ratio));
    }

    private static String percent(double share) {
        return String.format(Locale.ROOT, "%.1f", 100 * share);
    }
}
