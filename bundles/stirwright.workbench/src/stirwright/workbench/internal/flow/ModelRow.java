package stirwright.workbench.internal.flow;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import stirwright.correlation.Figures;
import stirwright.rheology.Estimate;
import stirwright.rheology.FluidModel;
import stirwright.rheology.Interval;
import stirwright.rheology.ModelFit;
import stirwright.rheology.ModelKind;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.Units;

/**
 * One model as the table and the chart show it.
 *
 * @param key unique among the rows
 * @param title in words
 * @param rank from 1; 0 for one that is not among the fitted ones
 * @param model empty where none describes the points
 * @param fit empty for the model of the study that no fit gave, and where none describes the points
 * @param rms root mean square of (fitted - measured) / measured; NaN without a model
 * @param deltaAicc NaN without one
 * @param notes warnings, or why there is no fit
 * @param style of its curve and its swatch
 * @param pick whether the fluid of the study is this very model
 * @param recommended whether nothing speaks for another
 */
public record ModelRow(
        String key, String title, ModelKind kind, int rank, Optional<FluidModel> model, Optional<ModelFit> fit, double rms,
        double deltaAicc, List<String> notes, int style, boolean pick, boolean recommended) {
    /** The key of the model of the study that no fit gave. */
    static final String IN_USE = "in use";

    public ModelRow {
        notes = List.copyOf(notes);
    }

    /** All parameters in one line, each with its interval and unit. */
    public String parameters() {
        return String.join(", ", parts());
    }

    private List<String> parts() {
        List<String> parts = new ArrayList<>();
        fit.ifPresentOrElse(f -> f.estimates().forEach(e -> parts.add(brief(e))), () -> model.ifPresent(m -> {
            double[] values = ModelKind.values(m);
            for (int i = 0; i < values.length; i++) {
                parts.add(Units.symbol(kind.parameters().get(i).symbol()) + " " + Figures.show(values[i])
                        + unit(kind.parameters().get(i).unit()));
            }
        }));
        return parts;
    }

    private static String brief(Estimate estimate) {
        String interval = estimate.interval().known()
                ? " (" + Figures.show(estimate.interval().low()) + "\u2013" + Figures.show(estimate.interval().high()) + ")" : " (?)";
        return Units.symbol(estimate.parameter().symbol()) + " " + Figures.show(estimate.value()) + interval + unit(estimate.parameter().unit());
    }

    static String unit(String unit) {
        return Units.show(unit).isEmpty() ? "" : " " + Units.show(unit);
    }

    /** "from 3.1 to 3.7"; an end that the points do not give is named so. */
    static String range(Interval interval) {
        return Messages.bind(FlowWords.Interval, end(interval.low()), end(interval.high()));
    }

    static String end(double value) {
        return Double.isNaN(value) ? FlowWords.Interval_open : Figures.show(value);
    }
}
