package stirwright.workbench.internal.flowpage;

import java.util.Set;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import stirwright.chart.ChartView;
import stirwright.study.Fluid;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.flow.FlowCurves;
import stirwright.workbench.internal.flow.FlowSheet;
import stirwright.workbench.internal.flow.ModelRow;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;

/** The flow curve on the window's chart, with a head of its own; without points, what to do next. */
public final class FlowChart {
    private final Composite area;
    private final ChartView chart;
    private final FlowCurves flow;
    private final FlowHead head;
    private final EmptyState empty;
    private boolean shown;

    /**
     * @param area with one column, which has the chart
     * @param bring opens the import
     */
    public FlowChart(Composite area, ChartView chart, Looks looks, FlowCurves flow, Runnable bring) {
        this.area = area;
        this.chart = chart;
        this.flow = flow;
        head = new FlowHead(area, looks, flow, bring, chart::reset);
        head.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        head.moveAbove(chart);
        empty = new EmptyState(area, looks, PageWords.Empty_import, bring);
        empty.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        flow.onSheet(() -> {
            if (shown) {
                show();
            }
        });
    }

    /** Takes the chart over, or leaves it to another page. */
    public void setShown(boolean wanted) {
        shown = wanted;
        if (wanted) {
            Names.name(chart, PageWords.Chart_name);
            show();
        } else {
            set(head, false);
            set(empty, false);
        }
    }

    private void show() {
        boolean none = flow.fluid().map(f -> f.getCurves().isEmpty()).orElse(true);
        boolean moved = set(head, !none) | set(empty, none) | set(chart, !none);
        empty.say(flow.fluid().map(Fluid::getName).map(n -> Messages.bind(PageWords.Empty_words, n)).orElse(PageWords.Empty_noCase));
        flow.sheet().filter(s -> !s.empty()).ifPresent(this::show);
        if (moved) {
            area.layout(true, true);
        }
    }

    private void show(FlowSheet sheet) {
        head.show(sheet);
        // What is switched off is not in the picture, so that no axis has to reach for it.
        chart.setHidden(Set.of());
        chart.show(sheet.picture());
        chart.highlight(flow.selected().map(ModelRow::key).orElse(null));
    }

    /** Says whether that changed anything. */
    private static boolean set(Control control, boolean wanted) {
        GridData data = (GridData) control.getLayoutData();
        boolean changed = data.exclude == wanted;
        data.exclude = !wanted;
        control.setVisible(wanted);
        return changed;
    }
}
