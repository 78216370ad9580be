package stirwright.workbench.internal.importing;

import java.util.List;
import java.util.function.Consumer;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;
import stirwright.exchange.PointPlace;
import stirwright.exchange.RawRow;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;

/** The source as it is, row by row; what is no point recedes. */
final class RawRows extends Composite {
    private static final int MOST_COLUMNS = 24;
    private static final int LOOKED_AT = 100;
    private static final int CELL_MARGIN = 14;
    private static final int LEAST_WIDTH = 36;
    private static final int MOST_WIDTH = 160;
    private static final int LINE_WIDTH = 52;

    private final Looks looks;
    private final Table table;
    private List<RawRow> rows = List.of();
    private Consumer<PointPlace> selected = place -> { };

    RawRows(Composite parent, Looks looks) {
        super(parent, SWT.NONE);
        this.looks = looks;
        looks.onPage(this);
        setBackgroundMode(SWT.INHERIT_FORCE);
        GridLayout layout = new GridLayout(1, false);
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        setLayout(layout);
        Label heading = looks.label(this, SWT.NONE, ImportWords.Raw_heading);
        heading.setFont(looks.strong());
        heading.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        table = Names.name(looks.table(new Table(this, SWT.FULL_SELECTION | SWT.SINGLE | SWT.VIRTUAL)), ImportWords.Raw_name);
        table.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        column(ImportWords.Raw_line, LINE_WIDTH, SWT.RIGHT);
        table.addListener(SWT.SetData, e -> fill((TableItem) e.item, table.indexOf((TableItem) e.item)));
        table.addListener(SWT.Selection, e -> {
            RawRow row = rows.get(table.getSelectionIndex());
            selected.accept(new PointPlace(row.sheet(), row.line(), 1));
        });
    }

    private void column(String title, int width, int style) {
        TableColumn column = new TableColumn(table, style);
        column.setText(title);
        column.setWidth(width);
    }

    void show(List<RawRow> all) {
        if (all.equals(rows)) {
            return;
        }
        rows = all;
        int columns = Math.min(MOST_COLUMNS, all.stream().mapToInt(r -> r.cells().size()).max().orElse(0));
        while (table.getColumnCount() - 1 > columns) {
            table.getColumn(table.getColumnCount() - 1).dispose();
        }
        while (table.getColumnCount() - 1 < columns) {
            column(String.valueOf(table.getColumnCount()), LEAST_WIDTH, SWT.LEFT);
        }
        fit();
        table.setItemCount(rows.size());
        table.clearAll();
    }

    /** Columns are as wide as the cells of points in them need, as far as a look at the first ones tells. */
    private void fit() {
        GC gc = new GC(table);
        gc.setFont(table.getFont());
        for (int c = 1; c < table.getColumnCount(); c++) {
            int at = c - 1;
            int width = rows.stream().filter(r -> r.kind() != RawRow.Kind.NOTE && r.kind() != RawRow.Kind.BLOCK).limit(LOOKED_AT)
                    .mapToInt(r -> gc.textExtent(r.cell(at)).x).max().orElse(0);
            table.getColumn(c).setWidth(Math.clamp(width + CELL_MARGIN, LEAST_WIDTH, MOST_WIDTH));
        }
        gc.dispose();
    }

    private void fill(TableItem item, int index) {
        RawRow row = rows.get(index);
        String[] texts = new String[table.getColumnCount()];
        texts[0] = String.valueOf(row.line());
        for (int i = 1; i < texts.length; i++) {
            texts[i] = row.cell(i - 1);
        }
        item.setText(texts);
        item.setForeground(row.kind() == RawRow.Kind.POINT ? looks.palette().text() : looks.palette().quiet());
    }

    /** Called with the place of a row that is selected by hand. */
    void onSelected(Consumer<PointPlace> listener) {
        selected = listener;
    }

    void reveal(PointPlace place) {
        for (int i = 0; i < rows.size(); i++) {
            if (rows.get(i).line() == place.line() && rows.get(i).sheet().equals(place.sheet())) {
                table.setSelection(i);
                table.showSelection();
                return;
            }
        }
    }
}
