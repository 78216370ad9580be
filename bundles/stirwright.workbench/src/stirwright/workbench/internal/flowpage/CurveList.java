package stirwright.workbench.internal.flowpage;

import java.util.List;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableItem;
import stirwright.chart.CurveStyle;
import stirwright.correlation.Figures;
import stirwright.study.Curve;
import stirwright.study.Curves;
import stirwright.study.Fluid;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.flow.FluidEdits;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;
import stirwright.workbench.internal.widgets.Shortened;
import stirwright.workbench.internal.widgets.Swatches;

/** The measured curves of a fluid: the check mark says whether models are fitted to one, the mark is that on the chart. */
public final class CurveList {
    private static final int MOST_ROWS = 9;
    /** For the check mark, the mark on the chart and the margins. */
    private static final int BESIDE_WORDS = 72;

    private final Fluid fluid;
    private final FluidEdits edits;
    private final Table table;
    private final Swatches swatches;
    private final Shortened shortened = new Shortened();

    public CurveList(Composite parent, Looks looks, Fluid fluid, FluidEdits edits) {
        this.fluid = fluid;
        this.edits = edits;
        table = Names.name(new Table(parent, SWT.CHECK | SWT.FULL_SELECTION | SWT.SINGLE | SWT.V_SCROLL), PageWords.Curves_name);
        table.setBackground(looks.palette().surface());
        table.setForeground(looks.palette().text());
        table.setFont(looks.small());
        swatches = new Swatches(table, looks.palette());
        table.addListener(SWT.Selection, this::selected);
        table.addListener(SWT.MouseHover, this::tip);
        table.addListener(SWT.Resize, e -> refresh());
        table.addListener(SWT.KeyDown, e -> {
            if (e.keyCode == SWT.DEL) {
                remove();
            }
        });
        refresh();
    }

    public Table control() {
        return table;
    }

    /** The height that shows all curves, or as many as leave room for what else stands there. */
    public int height() {
        return Math.clamp(fluid.getCurves().size(), 1, MOST_ROWS) * table.getItemHeight() + 2 * Looks.STEP;
    }

    /** Takes over what the study has. */
    public void refresh() {
        List<Curve> curves = List.copyOf(fluid.getCurves());
        while (table.getItemCount() > curves.size()) {
            table.getItem(table.getItemCount() - 1).dispose();
        }
        GC gc = new GC(table);
        gc.setFont(table.getFont());
        for (int i = 0; i < curves.size(); i++) {
            TableItem item = i < table.getItemCount() ? table.getItem(i) : new TableItem(table, SWT.NONE);
            Curve curve = curves.get(i);
            item.setData(curve);
            item.setChecked(curve.isUsed());
            item.setImage(swatches.mark(i % CurveStyle.COLOURS, curve.isUsed()));
            item.setText(shortened.fit(gc, words(curve), table.getClientArea().width - BESIDE_WORDS));
        }
        gc.dispose();
    }

    private static String words(Curve curve) {
        return Messages.bind(PageWords.Curves_line, curve.getLabel(), curve.getPoints().size());
    }

    private static String more(Curve curve) {
        double temperature = Curves.temperature(curve);
        return words(curve) + "\n" + curve.getSource()
                + (Double.isNaN(temperature) ? "" : "\n" + Messages.bind(PageWords.Curves_temperature, Figures.show(temperature)));
    }

    private void selected(Event event) {
        if (event.detail == SWT.CHECK) {
            edits.use((Curve) event.item.getData(), ((TableItem) event.item).getChecked());
        }
    }

    private void tip(Event event) {
        TableItem item = table.getItem(new Point(event.x, event.y));
        table.setToolTipText(item == null ? null : more((Curve) item.getData()));
    }

    /** Takes the selected curve out of the study. */
    public void remove() {
        if (table.getSelectionCount() > 0) {
            edits.remove((Curve) table.getSelection()[0].getData());
        }
    }
}
