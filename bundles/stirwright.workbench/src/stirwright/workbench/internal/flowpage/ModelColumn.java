package stirwright.workbench.internal.flowpage;

import java.util.Locale;
import java.util.function.Function;
import java.util.stream.Stream;
import stirwright.workbench.internal.flow.ModelRow;

/** The columns of the models. */
enum ModelColumn {
    RANK(PageWords.Column_rank, 0, true, r -> r.rank() > 0 ? String.valueOf(r.rank()) : ""),
    MODEL(PageWords.Column_model, 0, false, ModelRow::title),
    PARAMETERS(PageWords.Column_parameters, 1, false, ModelRow::parameters),
    RMS(PageWords.Column_rms, 0, true, r -> number("%.2f", 100 * r.rms())),
    DELTA(PageWords.Column_delta, 0, true, r -> number("%.1f", r.deltaAicc())),
    WARNINGS(PageWords.Column_warnings, 0, true, r -> r.notes().isEmpty() || r.rank() == 0 ? "" : String.valueOf(r.notes().size()));

    private final String title;
    private final int share;
    private final boolean number;
    private final Function<ModelRow, String> text;

    ModelColumn(String title, int share, boolean number, Function<ModelRow, String> text) {
        this.title = title;
        this.share = share;
        this.number = number;
        this.text = text;
    }

    private static String number(String format, double value) {
        return Double.isFinite(value) ? String.format(Locale.ROOT, format, value) : "";
    }

    String title() {
        return title;
    }

    /** What its head means; null where the words say it. */
    String tip() {
        return switch (this) {
            case PARAMETERS -> PageWords.Column_parametersTip;
            case RMS -> PageWords.Column_rmsTip;
            case DELTA -> PageWords.Column_deltaTip;
            case WARNINGS -> PageWords.Column_warningsTip;
            default -> null;
        };
    }

    /** Its share of the width that the others leave; 0 for one that gets what it needs. */
    int share() {
        return share;
    }

    boolean number() {
        return number;
    }

    String text(ModelRow row) {
        return text.apply(row);
    }

    /** What a cell does not show of a row; null where it shows all. */
    String tip(ModelRow row, String shown) {
        if (this == WARNINGS) {
            return row.notes().isEmpty() ? null : String.join("\n", row.notes());
        }
        String whole = this == PARAMETERS ? String.join("\n", Stream.of(row.parameters().split(", (?=[^)]*(\\(|$))")).toList()) : text(row);
        return number() || text(row).equals(shown) ? null : whole;
    }
}
