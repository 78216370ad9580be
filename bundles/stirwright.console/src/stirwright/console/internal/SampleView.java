package stirwright.console.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import stirwright.correlation.Figures;
import stirwright.exchange.SampleFits;
import stirwright.rheology.Hysteresis;
import stirwright.rheology.MeasuredWindow;
import stirwright.rheology.TemperatureLaw;
import stirwright.rheology.YieldRange;

/** What the curves of a sample say together, laid out for reading. */
final class SampleView {
    private static final String INDENT = "  ";

    private SampleView() {}

    /** Nothing for a sample that says no more than its curves do. */
    static void append(StringBuilder text, SampleFits sample) {
        List<String> lines = new ArrayList<>();
        for (SampleFits.AtTemperature at : sample.temperatures()) {
            String where = Double.isNaN(at.celsius()) ? "" : " at " + Figures.show(at.celsius()) + " deg C";
            at.loop().ifPresent(loop -> lines.add(loop(where, loop)));
            at.yieldStress().filter(range -> range.high() > 0).ifPresent(range -> lines.addAll(yieldStress(where, range)));
        }
        sample.law().ifPresent(law -> lines.addAll(law(law)));
        if (lines.isEmpty()) {
            return;
        }
        text.append("Sample ").append(sample.name()).append('\n');
        lines.forEach(line -> Columns.appendWrapped(text, INDENT, line, CaseView.WIDTH));
        text.append('\n');
    }

    private static String loop(String where, Hysteresis between) {
        MeasuredWindow common = between.common();
        double middle = Math.sqrt(common.min() * common.max());
        return String.format(Locale.ROOT, "up against down%s: area %s Pa/s, %.1f %% of that under the rising curve; stress up over"
                + " down %.3f at %s, %.3f at %s, %.3f at %s 1/s", where,
                Figures.show(between.area()), 100 * between.relativeArea(), between.ratioAt(common.min()), Figures.show(common.min()),
                between.ratioAt(middle), Figures.show(middle), between.ratioAt(common.max()), Figures.show(common.max()));
    }

    private static List<String> yieldStress(String where, YieldRange range) {
        List<String> lines = new ArrayList<>(List.of("yield stress" + where + " from " + Figures.show(range.low()) + " to "
                + Figures.show(range.high()) + " Pa, by model and ramp" + (hasStatic(range) ? " and as the vane gave it" : "")
                + ", intervals of 95 % included"));
        range.sources().stream().filter(s -> !s.counted())
                .forEach(s -> lines.add("  left out: " + Figures.show(s.value()) + " Pa by " + s.name() + ", which " + s.why()));
        return lines;
    }

    private static boolean hasStatic(YieldRange range) {
        return range.sources().stream().anyMatch(s -> s.name().equals(YieldRange.STATIC));
    }

    private static List<String> law(TemperatureLaw law) {
        List<String> lines = new ArrayList<>(List.of(String.format(Locale.ROOT, "%s from %s to %s deg C, one flow index, all else by"
                + " Arrhenius's law; misses the stresses by %.1f %% (root mean square), at most by %.0f %%:", law.kind().id(),
                Figures.show(law.lowest()), Figures.show(law.highest()), 100 * law.rmsRelative(), 100 * law.worst())));
        for (TemperatureLaw.Line line : law.lines()) {
            lines.add("  " + line.parameter().title() + (line.parameter().name().equals("flow_index")
                    ? " " + Figures.show(line.intercept())
                    : ": activation energy " + Figures.show(line.activationEnergy() / 1000) + " kJ/mol" + interval(line)));
        }
        return lines;
    }

    private static String interval(TemperatureLaw.Line line) {
        return line.interval().known() ? " (" + Figures.show(line.interval().low() / 1000) + " to "
                + Figures.show(line.interval().high() / 1000) + ")" : ", without an interval: two temperatures leave nothing to judge by";
    }
}
