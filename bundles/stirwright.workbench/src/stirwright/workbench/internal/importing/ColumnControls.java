package stirwright.workbench.internal.importing;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Combo;
import stirwright.exchange.ColumnChoice;
import stirwright.exchange.CurveColumn;
import stirwright.exchange.CurveQuantity;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.widgets.Form;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;

/** What each column holds and in which unit; both can be overruled. */
final class ColumnControls {
    private static final int QUANTITY_WIDTH = 26 * Looks.STEP;
    private static final int UNIT_WIDTH = 14 * Looks.STEP;
    private static final Map<CurveQuantity, List<String>> UNITS = Map.of(
            CurveQuantity.SHEAR_RATE, List.of("1/s", "1/min"),
            CurveQuantity.SHEAR_STRESS, List.of("Pa", "kPa", "mPa", "dyn/cm2"),
            CurveQuantity.VISCOSITY, List.of("Pa s", "mPa s", "cP", "P"),
            CurveQuantity.TEMPERATURE, List.of("deg C", "K", "deg F"),
            CurveQuantity.TIME, List.of("s", "min", "h"),
            CurveQuantity.TORQUE, List.of("N m", "mN m", "uN m"),
            CurveQuantity.TORQUE_PERCENT, List.of("%"),
            CurveQuantity.SPEED, List.of("rpm", "1/s"));

    private final Form form;
    private final ImportSession session;

    ColumnControls(Form form, ImportSession session) {
        this.form = form;
        this.session = session;
    }

    void build(List<ImportColumns.One> columns) {
        columns.forEach(this::line);
    }

    private void line(ImportColumns.One column) {
        String title = column.header().isEmpty() ? Messages.bind(ImportWords.Column_number, column.position()) : column.header();
        form.captioned(title, Messages.bind(ImportWords.Column_tip, column.position(),
                column.read().map(CurveColumn::reason).orElse(ImportWords.Column_notRead)));
        List<CurveQuantity> quantities = List.of(CurveQuantity.values());
        List<String> words = new ArrayList<>(List.of(ImportWords.Column_not));
        quantities.forEach(q -> words.add(q.words()));
        Combo quantity = combo(Messages.bind(ImportWords.Column_quantity, title), words,
                column.read().map(r -> quantities.indexOf(r.quantity()) + 1).orElse(0), QUANTITY_WIDTH);
        quantity.addListener(SWT.Selection, e -> choose(column, quantity.getSelectionIndex() == 0 ? Optional.empty()
                : Optional.of(quantities.get(quantity.getSelectionIndex() - 1)), ""));
        List<String> units = new ArrayList<>(column.read().map(r -> UNITS.getOrDefault(r.quantity(), List.of())).orElse(List.of()));
        String now = column.read().map(CurveColumn::unit).orElse("");
        if (!now.isEmpty() && !units.contains(now)) {
            units.add(0, now);
        }
        Combo unit = combo(Messages.bind(ImportWords.Column_unit, title), units, units.indexOf(now), UNIT_WIDTH);
        unit.setEnabled(units.size() > 1);
        unit.addListener(SWT.Selection, e -> choose(column, column.read().map(CurveColumn::quantity), units.get(unit.getSelectionIndex())));
    }

    private void choose(ImportColumns.One column, Optional<CurveQuantity> quantity, String unit) {
        session.choose(session.choice().with(new ColumnChoice("", column.position(), quantity, unit)));
    }

    private Combo combo(String name, List<String> words, int current, int width) {
        Combo combo = Names.name(new Combo(form, SWT.READ_ONLY | SWT.DROP_DOWN), name);
        combo.setItems(words.toArray(String[]::new));
        combo.select(current);
        combo.addListener(SWT.MouseVerticalWheel, e -> e.doit = false);
        GridData data = new GridData(SWT.FILL, SWT.CENTER, true, false);
        data.widthHint = width;
        combo.setLayoutData(data);
        return combo;
    }
}
