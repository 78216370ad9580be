package stirwright.workbench.internal.session;

import java.util.List;
import java.util.function.BooleanSupplier;
import stirwright.chart.Picture;
import stirwright.core.Catalogue;
import stirwright.workbench.internal.Messages;

/** Chooses what is drawn for a view. */
final class Pictures {

    private Pictures() {}

    static Picture of(
            Catalogue catalogue, Words words, View view, List<Sheet> sheets, List<Row> rows, BooleanSupplier stale) {
        Sheet main = sheets.get(0);
        if (!main.computed()) {
            return Picture.empty(main.result().refusal().map(words::of).orElse(""));
        }
        if (rows.isEmpty()) {
            return Picture.empty(Messages.bind(Messages.Chart_noCandidates, view.title(), main.familyTitle()));
        }
        return switch (view) {
            case POWER_NUMBER, FLOW_NUMBER -> SlicePicture.overReynolds(catalogue, view, sheets, rows, stale);
            case SHEAR_RATE_CONSTANT -> SlicePicture.overFlowIndex(catalogue, view, sheets, rows, stale);
            case POWER, TORQUE -> SpeedPicture.of(catalogue, view, sheets, rows, stale);
        };
    }
}
