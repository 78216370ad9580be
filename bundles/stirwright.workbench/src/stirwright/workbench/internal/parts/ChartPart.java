package stirwright.workbench.internal.parts;

import jakarta.annotation.PostConstruct;
import jakarta.inject.Inject;
import java.util.Arrays;
import org.eclipse.e4.ui.di.Focus;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Link;
import stirwright.chart.ChartView;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.session.Outcome;
import stirwright.workbench.internal.session.Row;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.session.View;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;
import stirwright.workbench.internal.widgets.WordBar;

/** The numbers of the pick, and every candidate as a curve. */
public final class ChartPart {
    @Inject
    private Session session;

    @Inject
    private Looks looks;

    private ResultStrip strip;
    private WordBar views;
    private ChartView chart;

    @PostConstruct
    void create(Composite parent) {
        Composite area = looks.area(parent);
        area.setLayout(layout(1));
        strip = new ResultStrip(area, looks);
        strip.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        Composite head = looks.area(area);
        head.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        GridLayout headLayout = new GridLayout(2, false);
        headLayout.marginWidth = 0;
        headLayout.marginHeight = 0;
        head.setLayout(headLayout);
        views = new WordBar(head, looks, Messages.Chart_selector,
                Arrays.stream(View.values()).map(View::title).toList(), i -> session.show(View.values()[i]));
        views.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        Link whole = looks.link(head, Messages.Chart_reset, () -> chart.reset());
        whole.setToolTipText(Messages.Chart_resetTip);
        chart = new ChartView(area, looks.palette());
        chart.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        Names.name(chart, Messages.Chart_name);
        chart.setLegend(false);
        chart.onSelected(session::select);
        session.onOutcome(this::showOutcome);
        session.onSelection(this::showSelection);
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

    private void showOutcome() {
        Outcome outcome = session.outcome().orElseThrow();
        strip.show(outcome);
        views.setCurrent(outcome.view().ordinal());
        chart.show(outcome.picture());
        showSelection();
    }

    private void showSelection() {
        chart.setHidden(session.hidden());
        chart.highlight(session.selected().map(Row::key).orElse(null));
    }

    @Focus
    void focus() {
        chart.setFocus();
    }
}
