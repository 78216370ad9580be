package stirwright.workbench.internal.parts;

import java.util.Arrays;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Link;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.session.Outcome;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.session.View;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.WordBar;

/** Above the chart of a case: the numbers of the pick, and what the chart draws. */
final class CaseHead extends Composite {
    private final ResultStrip strip;
    private final WordBar views;

    /** @param reset shows everything on the chart */
    CaseHead(Composite parent, Looks looks, Session session, Runnable reset) {
        super(parent, SWT.NONE);
        looks.onPage(this);
        GridLayout layout = new GridLayout(1, false);
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        layout.verticalSpacing = 2 * Looks.STEP;
        setLayout(layout);
        strip = new ResultStrip(this, looks);
        strip.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        Composite line = looks.area(this);
        line.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        GridLayout lineLayout = new GridLayout(2, false);
        lineLayout.marginWidth = 0;
        lineLayout.marginHeight = 0;
        line.setLayout(lineLayout);
        views = new WordBar(line, looks, Messages.Chart_selector,
                Arrays.stream(View.values()).map(View::title).toList(), i -> session.show(View.values()[i]));
        views.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        Link whole = looks.link(line, Messages.Chart_reset, reset);
        whole.setToolTipText(Messages.Chart_resetTip);
    }

    void show(Outcome outcome) {
        strip.show(outcome);
        views.setCurrent(outcome.view().ordinal());
    }
}
