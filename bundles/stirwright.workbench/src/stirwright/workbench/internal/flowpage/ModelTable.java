package stirwright.workbench.internal.flowpage;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;
import stirwright.workbench.internal.flow.FlowCurves;
import stirwright.workbench.internal.flow.FlowSheet;
import stirwright.workbench.internal.flow.ModelRow;
import stirwright.workbench.internal.widgets.Aligned;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;
import stirwright.workbench.internal.widgets.Shortened;
import stirwright.workbench.internal.widgets.Swatches;

/** The models, best first: the check mark switches the curve, whose swatch stands beside it. */
final class ModelTable extends Composite {
    /** For the check mark and the swatch. */
    private static final int SWATCH_WIDTH = 70;
    private static final int CELL_MARGIN = 12;
    private static final int HEAD_MARGIN = 16;
    /** The title of a model in use is cut rather than the parameters of all. */
    private static final int MOST_NEEDED = 132;

    private final Looks looks;
    private final FlowCurves flow;
    private final Table table;
    private final Swatches swatches;
    private final Shortened shortened = new Shortened();
    private final Shortened shortenedStrong = new Shortened();

    ModelTable(Composite parent, Looks looks, FlowCurves flow) {
        super(parent, SWT.NONE);
        this.looks = looks;
        this.flow = flow;
        setLayout(new FillLayout());
        table = Names.name(new Table(this, SWT.CHECK | SWT.FULL_SELECTION | SWT.SINGLE), PageWords.Table_name);
        looks.table(table);
        swatches = new Swatches(table, looks.palette());
        TableColumn swatch = new TableColumn(table, SWT.LEFT);
        swatch.setText(PageWords.Column_curve);
        swatch.setWidth(SWATCH_WIDTH);
        for (ModelColumn column : ModelColumn.values()) {
            TableColumn made = new TableColumn(table, column.number() ? SWT.RIGHT : SWT.LEFT);
            made.setText(column.title());
            made.setToolTipText(column.tip());
        }
        table.addListener(SWT.Selection, this::selected);
        table.addListener(SWT.MouseHover, this::tip);
        table.addListener(SWT.Resize, e -> flow.sheet().ifPresent(this::show));
    }

    void show(FlowSheet sheet) {
        List<ModelRow> rows = sheet.rows();
        table.setRedraw(false);
        while (table.getItemCount() > rows.size()) {
            table.getItem(table.getItemCount() - 1).dispose();
        }
        while (table.getItemCount() < rows.size()) {
            new TableItem(table, SWT.NONE);
        }
        fit(rows);
        for (ModelColumn column : ModelColumn.values()) {
            List<String> texts = rows.stream().map(column::text).toList();
            List<String> shown = column.number() ? Aligned.atDecimalSign(texts) : fitted(texts, rows, column);
            for (int r = 0; r < rows.size(); r++) {
                table.getItem(r).setText(column.ordinal() + 1, shown.get(r));
            }
        }
        for (int r = 0; r < rows.size(); r++) {
            TableItem item = table.getItem(r);
            ModelRow row = rows.get(r);
            item.setData(row);
            item.setFont(row.pick() ? looks.smallStrong() : null);
            item.setImage(0, row.model().isPresent() ? swatches.of(row.style(), row.pick()) : null);
            item.setChecked(!sheet.hidden().contains(row.key()));
            boolean selected = row.key().equals(sheet.selected());
            item.setForeground(ModelColumn.WARNINGS.ordinal() + 1, selected ? null : looks.palette().near());
            if (selected && (table.getSelectionCount() == 0 || table.getSelection()[0] != item)) {
                table.setSelection(item);
            }
        }
        table.setRedraw(true);
    }

    private List<String> fitted(List<String> texts, List<ModelRow> rows, ModelColumn column) {
        GC gc = new GC(table);
        int width = table.getColumn(column.ordinal() + 1).getWidth() - CELL_MARGIN;
        List<String> shown = new ArrayList<>();
        for (int r = 0; r < texts.size(); r++) {
            gc.setFont(rows.get(r).pick() ? looks.smallStrong() : looks.small());
            shown.add((rows.get(r).pick() ? shortenedStrong : shortened).fit(gc, texts.get(r), width));
        }
        gc.dispose();
        return shown;
    }

    /** Numbers get what they need, words share the rest, so that nothing is scrolled sideways. */
    private void fit(List<ModelRow> rows) {
        int left = table.getClientArea().width - SWATCH_WIDTH;
        int shares = 0;
        GC gc = new GC(table);
        gc.setFont(looks.smallStrong());
        for (ModelColumn column : ModelColumn.values()) {
            if (column.share() == 0) {
                int width = gc.textExtent(column.title()).x + HEAD_MARGIN;
                for (String number : Aligned.atDecimalSign(rows.stream().map(column::text).toList())) {
                    width = Math.max(width, gc.textExtent(number).x + CELL_MARGIN);
                }
                width = Math.min(width, MOST_NEEDED);
                table.getColumn(column.ordinal() + 1).setWidth(width);
                left -= width;
            }
            shares += column.share();
        }
        gc.dispose();
        for (ModelColumn column : ModelColumn.values()) {
            if (column.share() > 0) {
                table.getColumn(column.ordinal() + 1).setWidth(Math.max(0, left * column.share() / shares));
            }
        }
    }

    private void selected(Event event) {
        ModelRow row = (ModelRow) event.item.getData();
        if (event.detail == SWT.CHECK) {
            flow.setShown(row.key(), ((TableItem) event.item).getChecked());
        } else {
            flow.select(row.key());
        }
    }

    /** What a cell could not show. */
    private void tip(Event event) {
        TableItem item = table.getItem(new Point(event.x, event.y));
        String words = null;
        for (ModelColumn column : ModelColumn.values()) {
            if (item != null && item.getBounds(column.ordinal() + 1).contains(event.x, event.y)) {
                words = column.tip((ModelRow) item.getData(), item.getText(column.ordinal() + 1));
            }
        }
        table.setToolTipText(words);
    }

    @Override
    public boolean setFocus() {
        return table.setFocus();
    }
}
