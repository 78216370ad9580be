package stirwright.workbench.internal.flow;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import stirwright.correlation.Figures;
import stirwright.rheology.Estimate;
import stirwright.rheology.Interval;
import stirwright.rheology.ModelKind;
import stirwright.rheology.RankedFits;
import stirwright.workbench.internal.Messages;

/** What is to be said of one model: its parameters, why it stands where it stands, and what is doubtful. */
public final class ModelCard {

    private ModelCard() {}

    /** The sections of the card of a row, those of all models after its own. */
    public static List<Section> of(FlowSheet sheet, ModelRow row) {
        List<Section> sections = new ArrayList<>();
        sections.add(new Section(row.title(), quality(row)));
        if (row.recommended()) {
            sections.add(new Section(FlowWords.Row_why, List.of(sheet.reason())));
        }
        if (!row.notes().isEmpty()) {
            sections.add(new Section(row.model().isEmpty() ? FlowWords.Row_noFit : FlowWords.Row_warnings, row.notes()));
        }
        if (row.model().isPresent()) {
            sections.add(new Section(row.fit().isPresent() ? FlowWords.Parameter_heading : FlowWords.Parameter_inUse, parameters(row)));
        }
        sections.addAll(sheet.about());
        return sections;
    }

    private static List<String> parameters(ModelRow row) {
        List<String> lines = new ArrayList<>();
        row.fit().ifPresentOrElse(f -> f.estimates().forEach(e -> lines.add(parameter(e))), () -> row.model().ifPresent(m -> {
            double[] values = ModelKind.values(m);
            for (int i = 0; i < values.length; i++) {
                lines.add(row.kind().parameters().get(i).title() + " " + Figures.show(values[i])
                        + ModelRow.unit(row.kind().parameters().get(i).unit()));
            }
        }));
        return lines;
    }

    /** How well it fits, in one line; none without a model. */
    private static List<String> quality(ModelRow row) {
        if (Double.isNaN(row.rms())) {
            return List.of();
        }
        String rms = Messages.bind(FlowWords.Row_rms, String.format(Locale.ROOT, "%.2f", 100 * row.rms()));
        if (row.deltaAicc() == 0) {
            return List.of(rms + ", " + FlowWords.Row_least);
        }
        return List.of(Double.isNaN(row.deltaAicc()) ? rms : rms + ", " + Messages.bind(FlowWords.Row_delta,
                String.format(Locale.ROOT, "%.1f", row.deltaAicc()), RankedFits.meaning(row.deltaAicc())));
    }

    private static String parameter(Estimate estimate) {
        String value = Figures.show(estimate.value()) + ModelRow.unit(estimate.parameter().unit());
        return Messages.bind(FlowWords.Parameter, new Object[] {estimate.parameter().title(), value, intervals(estimate)});
    }

    private static String intervals(Estimate estimate) {
        if (Double.isNaN(estimate.interval().low()) && Double.isNaN(estimate.interval().high())) {
            return FlowWords.Parameter_none;
        }
        String own = interval(FlowWords.Interval, estimate.interval());
        return estimate.joint().known() ? Messages.bind(FlowWords.Parameter_joint, own, interval(FlowWords.Interval, estimate.joint())) : own;
    }

    private static String interval(String words, Interval interval) {
        return Messages.bind(words, ModelRow.end(interval.low()), ModelRow.end(interval.high()));
    }
}
