package stirwright.workbench.internal.parts;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Font;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Menu;
import org.eclipse.swt.widgets.MenuItem;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.session.Outcome;
import stirwright.workbench.internal.session.Row;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Aligned;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;
import stirwright.workbench.internal.widgets.Shortened;
import stirwright.workbench.internal.widgets.Swatches;

/**
 * The candidates, a row each: the check mark switches the curve, its swatch is the chart's legend, a click on a column's
 * head sorts.
 */
final class CandidateTable extends Composite {
    /** For the check mark and the swatch. */
    private static final int SWATCH_WIDTH = 72;
    /** What a cell keeps free on both sides of its text. */
    private static final int CELL_MARGIN = 12;
    /** The same for a head, which has room for the sign of its order. */
    private static final int HEAD_MARGIN = 24;

    private final Looks looks;
    private final Session session;
    private final Table table;
    private final Font strong;
    private final Shortened shortened = new Shortened();
    private final Shortened shortenedStrong = new Shortened();
    private final Swatches swatches;
    private final List<CandidateColumn> columns = new ArrayList<>();
    private CandidateColumn sortedBy;
    private boolean descending;

    CandidateTable(Composite parent, Looks looks, Session session) {
        super(parent, SWT.NONE);
        this.looks = looks;
        this.session = session;
        setLayout(new FillLayout());
        table = Names.name(new Table(this, SWT.CHECK | SWT.FULL_SELECTION | SWT.SINGLE), Messages.Table_name);
        table.setHeaderVisible(true);
        table.setBackground(looks.palette().surface());
        table.setForeground(looks.palette().text());
        table.addListener(SWT.Selection, this::selected);
        table.addListener(SWT.MouseHover, this::tip);
        table.addListener(SWT.Resize, e -> session.outcome().ifPresent(o -> show()));
        table.setMenu(sortMenu());
        table.setFont(looks.small());
        swatches = new Swatches(table, looks.palette());
        strong = looks.smallStrong();
        session.onOutcome(this::show);
        session.onSelection(this::showSelection);
        session.outcome().ifPresent(o -> show());
    }

    private void show() {
        Outcome outcome = session.outcome().orElseThrow();
        makeColumns(outcome);
        fit(outcome.rows());
        List<Row> rows = sorted(outcome.rows());
        table.setRedraw(false);
        while (table.getItemCount() > rows.size()) {
            table.getItem(table.getItemCount() - 1).dispose();
        }
        while (table.getItemCount() < rows.size()) {
            new TableItem(table, SWT.NONE);
        }
        for (int c = 0; c < columns.size(); c++) {
            fill(c, rows);
        }
        for (int r = 0; r < rows.size(); r++) {
            TableItem item = table.getItem(r);
            Row row = rows.get(r);
            item.setData(row);
            item.setFont(row.pick() ? strong : null);
            item.setImage(0, swatches.of(row.style(), row.pick()));
        }
        table.setRedraw(true);
        showSelection();
    }

    private void fill(int c, List<Row> rows) {
        List<String> texts = rows.stream().map(columns.get(c)::text).toList();
        List<String> shown = columns.get(c).number() ? Aligned.atDecimalSign(texts) : fitted(texts, rows, c);
        for (int r = 0; r < shown.size(); r++) {
            TableItem item = table.getItem(r);
            if (!item.getText(c + 1).equals(shown.get(r))) {
                item.setText(c + 1, shown.get(r));
            }
        }
    }

    private List<String> fitted(List<String> texts, List<Row> rows, int c) {
        GC gc = new GC(table);
        int width = table.getColumn(c + 1).getWidth() - CELL_MARGIN;
        List<String> shown = new ArrayList<>();
        for (int r = 0; r < texts.size(); r++) {
            boolean pick = rows.get(r).pick();
            Shortened fit = pick ? shortenedStrong : shortened;
            gc.setFont(pick ? strong : looks.small());
            shown.add(columns.get(c).keepsEnd() ? fit.fitMiddle(gc, texts.get(r), width) : fit.fit(gc, texts.get(r), width));
        }
        gc.dispose();
        return shown;
    }

    /** What a cell could not show. */
    private void tip(Event event) {
        TableItem item = table.getItem(new Point(event.x, event.y));
        String words = null;
        for (int c = 0; item != null && c < columns.size(); c++) {
            if (item.getBounds(c + 1).contains(event.x, event.y)) {
                words = columns.get(c).tip((Row) item.getData(), item.getText(c + 1));
            }
        }
        table.setToolTipText(words);
    }

    private List<Row> sorted(List<Row> rows) {
        if (sortedBy == null) {
            return rows;
        }
        Comparator<Row> order = descending ? sortedBy.order().reversed() : sortedBy.order();
        return rows.stream().sorted(order).toList();
    }

    private void makeColumns(Outcome outcome) {
        List<CandidateColumn> wanted = Arrays.stream(CandidateColumn.values())
                .filter(c -> c.shownIn(outcome.view(), outcome.sheets().size() > 1, table.getClientArea().width)).toList();
        if (!wanted.equals(columns)) {
            // Items would carry the texts of the old columns over.
            table.removeAll();
            for (TableColumn old : table.getColumns()) {
                old.dispose();
            }
            columns.clear();
            columns.addAll(wanted);
            TableColumn swatch = new TableColumn(table, SWT.LEFT);
            swatch.setText(Messages.Column_curve);
            swatch.setWidth(SWATCH_WIDTH);
            columns.forEach(this::makeColumn);
            if (!columns.contains(sortedBy)) {
                sortedBy = null;
            }
            if (sortedBy != null) {
                table.setSortColumn(table.getColumn(columns.indexOf(sortedBy) + 1));
            }
        }
        for (int c = 0; c < columns.size(); c++) {
            table.getColumn(c + 1).setText(columns.get(c).title(outcome.view()));
            table.getColumn(c + 1).setToolTipText(columns.get(c).tip());
        }
    }

    /** The same as a click on a head, by the keyboard. */
    private Menu sortMenu() {
        Menu menu = new Menu(table);
        menu.addListener(SWT.Show, e -> {
            for (MenuItem old : menu.getItems()) {
                old.dispose();
            }
            for (CandidateColumn column : columns) {
                MenuItem item = new MenuItem(menu, SWT.PUSH);
                item.setText(Messages.bind(Messages.Table_sortBy, column.title(session.view())));
                item.addListener(SWT.Selection, s -> sortBy(table.getColumn(columns.indexOf(column) + 1), column));
            }
        });
        return menu;
    }

    private void makeColumn(CandidateColumn column) {
        TableColumn made = new TableColumn(table, column.number() ? SWT.RIGHT : SWT.LEFT);
        made.addListener(SWT.Selection, e -> sortBy(made, column));
    }

    private void sortBy(TableColumn clicked, CandidateColumn column) {
        descending = sortedBy == column && !descending;
        sortedBy = column;
        table.setSortColumn(clicked);
        table.setSortDirection(descending ? SWT.DOWN : SWT.UP);
        session.outcome().ifPresent(o -> show());
    }

    /** Numbers get what they need, words share the rest, so that no digit is cut and nothing is scrolled sideways. */
    private void fit(List<Row> rows) {
        if (table.getColumnCount() == 0 || table.getClientArea().width <= 0) {
            return;
        }
        int[] widths = new int[columns.size()];
        int left = table.getClientArea().width - SWATCH_WIDTH;
        int shares = 0;
        GC gc = new GC(table);
        gc.setFont(strong);
        for (int c = 0; c < widths.length; c++) {
            if (columns.get(c).number()) {
                widths[c] = numberWidth(gc, columns.get(c), rows);
                left -= widths[c];
            } else {
                shares += columns.get(c).share();
            }
        }
        gc.dispose();
        for (int c = 0; c < widths.length; c++) {
            int width = columns.get(c).number() ? widths[c] : Math.max(0, left * columns.get(c).share() / Math.max(1, shares));
            if (table.getColumn(c + 1).getWidth() != width) {
                table.getColumn(c + 1).setWidth(width);
            }
        }
    }

    private int numberWidth(GC gc, CandidateColumn column, List<Row> rows) {
        int width = gc.textExtent(column.title(session.view())).x + HEAD_MARGIN;
        for (String number : Aligned.atDecimalSign(rows.stream().map(column::text).toList())) {
            width = Math.max(width, gc.textExtent(number).x + CELL_MARGIN);
        }
        return width;
    }

    private void selected(Event event) {
        Row row = (Row) event.item.getData();
        if (event.detail == SWT.CHECK) {
            session.setHidden(row.key(), !((TableItem) event.item).getChecked());
        } else {
            session.select(row.key());
        }
    }

    private void showSelection() {
        String key = session.selected().map(Row::key).orElse("");
        for (TableItem item : table.getItems()) {
            Row row = (Row) item.getData();
            boolean selected = row.key().equals(key);
            item.setChecked(!session.hidden().contains(row.key()));
            // On the selection the system's own colour is the one that can be read.
            item.setForeground(columns.indexOf(CandidateColumn.VERDICT) + 1, selected ? null : CandidateColumn.colour(row.verdict(), looks.palette()));
            if (selected && (table.getSelectionCount() == 0 || table.getSelection()[0] != item)) {
                table.setSelection(item);
            }
        }
    }

    @Override
    public boolean setFocus() {
        return table.setFocus();
    }
}
