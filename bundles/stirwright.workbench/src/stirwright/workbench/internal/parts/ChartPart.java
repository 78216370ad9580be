package stirwright.workbench.internal.parts;

import jakarta.annotation.PostConstruct;
import jakarta.inject.Inject;
import org.eclipse.e4.ui.di.Focus;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import stirwright.chart.ChartView;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.flow.FlowCurves;
import stirwright.workbench.internal.flowpage.FlowChart;
import stirwright.workbench.internal.importing.CurveImports;
import stirwright.workbench.internal.session.Outcome;
import stirwright.workbench.internal.session.Page;
import stirwright.workbench.internal.session.Pages;
import stirwright.workbench.internal.session.Row;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;

/** The one chart of the window, with the head that belongs to the page. */
public final class ChartPart {
    @Inject
    private Session session;

    @Inject
    private Looks looks;

    @Inject
    private Pages pages;

    @Inject
    private FlowCurves flow;

    @Inject
    private CurveImports imports;

    private Composite area;
    private CaseHead head;
    private ChartView chart;
    /** Made when its page is shown first. */
    private FlowChart flowChart;

    @PostConstruct
    void create(Composite parent) {
        area = looks.area(parent);
        area.setLayout(layout(1));
        head = new CaseHead(area, looks, session, () -> chart.reset());
        head.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        chart = new ChartView(area, looks.palette());
        chart.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        Names.name(chart, Messages.Chart_name);
        chart.setLegend(false);
        chart.onSelected(this::select);
        session.onOutcome(this::showOutcome);
        session.onSelection(this::showSelection);
        pages.onTurn(this::turn);
        session.outcome().ifPresent(o -> showOutcome());
    }

    static GridLayout layout(int columns) {
        GridLayout layout = new GridLayout(columns, false);
        layout.marginWidth = 4 * Looks.STEP;
        layout.marginHeight = 2 * Looks.STEP;
        layout.verticalSpacing = 2 * Looks.STEP;
        layout.horizontalSpacing = 2 * Looks.STEP;
        return layout;
    }

    private boolean ofCase() {
        return pages.current() == Page.CASE;
    }

    private void select(String id) {
        if (ofCase()) {
            session.select(id);
        } else if (flow.sheet().filter(s -> s.rows().stream().anyMatch(r -> r.key().equals(id))).isPresent()) {
            flow.select(id);
        }
    }

    /** Puts the head and the chart of the page in place of those of the other. */
    private void turn() {
        if (flowChart == null && !ofCase()) {
            flowChart = new FlowChart(area, chart, looks, flow, () -> imports.choose(area.getShell()));
        }
        shown(head, ofCase());
        if (flowChart != null) {
            flowChart.setShown(!ofCase());
        }
        if (ofCase()) {
            shown(chart, true);
            Names.name(chart, Messages.Chart_name);
            session.outcome().ifPresent(o -> showOutcome());
        }
        area.layout(true, true);
    }

    private static void shown(Control control, boolean wanted) {
        ((GridData) control.getLayoutData()).exclude = !wanted;
        control.setVisible(wanted);
    }

    private void showOutcome() {
        Outcome outcome = session.outcome().orElseThrow();
        head.show(outcome);
        if (ofCase()) {
            chart.show(outcome.picture());
            showSelection();
        }
    }

    private void showSelection() {
        if (ofCase()) {
            chart.setHidden(session.hidden());
            chart.highlight(session.selected().map(Row::key).orElse(null));
        }
    }

    @Focus
    void focus() {
        chart.setFocus();
    }
}
