package stirwright.workbench.internal.flow;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import stirwright.correlation.Figures;
import stirwright.rheology.TemperatureLaw;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.session.ModelTitles;

/** How the fluid changes with the temperature, in sentences. */
final class TemperatureWords {
    private static final double KILO = 1000;

    private TemperatureWords() {}

    static List<String> of(TemperatureLaw law) {
        List<String> lines = new ArrayList<>();
        lines.add(Messages.bind(FlowWords.Law_range,
                new Object[] {ModelTitles.of(law.kind()), Figures.show(law.lowest()), Figures.show(law.highest()),
                    String.format(Locale.ROOT, "%.1f", 100 * law.rmsRelative()), String.format(Locale.ROOT, "%.0f", 100 * law.worst())}));
        for (TemperatureLaw.Line line : law.lines()) {
            lines.add(line.parameter().name().equals("flow_index")
                    ? Messages.bind(FlowWords.Law_common, line.parameter().title(), Figures.show(line.intercept()))
                    : Messages.bind(FlowWords.Law_energy, new Object[] {line.parameter().title(), Figures.show(line.activationEnergy() / KILO),
                        interval(line)}));
        }
        return lines;
    }

    private static String interval(TemperatureLaw.Line line) {
        return !line.interval().known() ? FlowWords.Law_twoTemperatures
                : Messages.bind(FlowWords.Parameter_interval, Figures.show(line.interval().low() / KILO),
                        Figures.show(line.interval().high() / KILO));
    }
}
