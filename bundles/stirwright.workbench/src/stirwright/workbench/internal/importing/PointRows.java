package stirwright.workbench.internal.importing;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;
import stirwright.correlation.Figures;
import stirwright.exchange.CurveBlock;
import stirwright.exchange.CurveImport;
import stirwright.exchange.CurvePoint;
import stirwright.exchange.DroppedPoint;
import stirwright.exchange.PointPlace;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;
import stirwright.workbench.internal.widgets.Shortened;

/** What comes of the source: the points of all blocks in SI units. The check mark takes a point, or drops it. */
final class PointRows extends Composite {
    private static final int[] WIDTHS = {64, 34, 64, 66, 72, 46};
    private static final int CELL_MARGIN = 12;
    private static final int LEAST_REASON = 60;

    private final Shortened shortened = new Shortened();
    private final Looks looks;
    private final ImportSession session;
    private final Table table;
    private final Button droppedOnly;
    private final Map<PointPlace, DroppedPoint> dropped = new HashMap<>();
    private List<Line> lines = List.of();
    private Consumer<PointPlace> selected = place -> { };

    private record Line(CurveBlock block, CurvePoint point) { }

    PointRows(Composite parent, Looks looks, ImportSession session) {
        super(parent, SWT.NONE);
        this.looks = looks;
        this.session = session;
        looks.onPage(this);
        setBackgroundMode(SWT.INHERIT_FORCE);
        GridLayout layout = new GridLayout(2, false);
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        setLayout(layout);
        Label heading = looks.label(this, SWT.NONE, ImportWords.Points_heading);
        heading.setFont(looks.strong());
        heading.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
        droppedOnly = looks.onPage(new Button(this, SWT.CHECK));
        droppedOnly.setText(Messages.bind(ImportWords.Points_droppedOnly, 0));
        droppedOnly.addListener(SWT.Selection, e -> show());
        table = Names.name(looks.table(new Table(this, SWT.CHECK | SWT.FULL_SELECTION | SWT.SINGLE | SWT.VIRTUAL)), ImportWords.Points_name);
        table.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true, 2, 1));
        for (String title : List.of(ImportWords.Raw_line, ImportWords.Points_block, ImportWords.Points_rate, ImportWords.Points_stress,
                ImportWords.Points_viscosity, ImportWords.Points_temperature, ImportWords.Points_reason)) {
            boolean words = title.equals(ImportWords.Points_reason) || title.equals(ImportWords.Raw_line);
            new TableColumn(table, words ? SWT.LEFT : SWT.RIGHT).setText(title);
        }
        table.addListener(SWT.SetData, e -> fill((TableItem) e.item, table.indexOf((TableItem) e.item)));
        table.addListener(SWT.Selection, this::selected);
        table.addListener(SWT.MouseHover, this::tip);
        table.addListener(SWT.Resize, e -> {
            fit();
            table.clearAll();
        });
    }

    void show() {
        CurveImport found = session.found().orElse(null);
        dropped.clear();
        List<Line> all = new ArrayList<>();
        if (found != null) {
            found.dropped().forEach(d -> dropped.put(d.place(), d));
            for (CurveBlock block : found.blocks()) {
                block.points().stream().filter(p -> !droppedOnly.getSelection() || !p.taken()).forEach(p -> all.add(new Line(block, p)));
            }
        }
        droppedOnly.setText(Messages.bind(ImportWords.Points_droppedOnly, dropped.size()));
        droppedOnly.requestLayout();
        int top = table.getTopIndex();
        lines = all;
        table.setItemCount(lines.size());
        table.clearAll();
        table.setTopIndex(Math.min(top, Math.max(0, lines.size() - 1)));
        fit();
    }

    private void fit() {
        int left = table.getClientArea().width;
        for (int i = 0; i < WIDTHS.length; i++) {
            table.getColumn(i).setWidth(WIDTHS[i]);
            left -= WIDTHS[i];
        }
        table.getColumn(WIDTHS.length).setWidth(Math.max(LEAST_REASON, left));
    }

    private void fill(TableItem item, int index) {
        Line line = lines.get(index);
        CurvePoint point = line.point();
        GC gc = new GC(table);
        gc.setFont(table.getFont());
        String reason = shortened.fit(gc, reason(line), table.getColumn(WIDTHS.length).getWidth() - CELL_MARGIN);
        gc.dispose();
        item.setText(new String[] {String.valueOf(point.place().line()), String.valueOf(line.block().number()), number(point.shearRate()),
            number(point.shearStress()), number(point.viscosity()), number(point.temperature()), reason});
        item.setChecked(point.taken());
        item.setGrayed(!line.block().taken());
        item.setForeground(point.taken() && line.block().taken() ? looks.palette().text() : looks.palette().quiet());
    }

    private static String reason(Line line) {
        return !line.point().taken() ? line.point().dropped() : line.block().taken() ? line.point().status() : ImportWords.Points_blockLeft;
    }

    private static String number(double value) {
        return Double.isNaN(value) ? "" : Figures.show(value);
    }

    private void selected(Event event) {
        TableItem item = (TableItem) event.item;
        CurvePoint point = lines.get(table.indexOf(item)).point();
        if (event.detail != SWT.CHECK) {
            selected.accept(point.place());
        } else if (point.taken()) {
            session.choose(session.choice().leavingOut(point.place()));
        } else if (dropped.containsKey(point.place()) && dropped.get(point.place()).canBePutBack()) {
            session.choose(session.choice().puttingBack(point.place()));
        } else {
            // Without two numbers above 0 there is no point to take.
            item.setChecked(false);
        }
    }

    private void tip(Event event) {
        TableItem item = table.getItem(new Point(event.x, event.y));
        String words = item == null ? "" : reason(lines.get(table.indexOf(item)));
        table.setToolTipText(words.isEmpty() ? null : words);
    }

    /** Called with the place of a point that is selected by hand. */
    void onSelected(Consumer<PointPlace> listener) {
        selected = listener;
    }

    void reveal(PointPlace place) {
        for (int i = 0; i < lines.size(); i++) {
            PointPlace here = lines.get(i).point().place();
            if (here.line() == place.line() && here.sheet().equals(place.sheet())) {
                table.setSelection(i);
                table.showSelection();
                return;
            }
        }
    }
}
