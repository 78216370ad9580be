package stirwright.workbench.internal.parts;

import jakarta.annotation.PostConstruct;
import jakarta.inject.Inject;
import org.eclipse.e4.ui.di.Focus;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.SashForm;
import org.eclipse.swt.custom.StackLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import stirwright.workbench.internal.app.CardsWindow;
import stirwright.workbench.internal.flow.FlowCurves;
import stirwright.workbench.internal.flowpage.FlowBelow;
import stirwright.workbench.internal.session.Page;
import stirwright.workbench.internal.session.Pages;
import stirwright.workbench.internal.session.Problems;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Looks;

/** Below the chart: of a case its candidates with the card of the selected one, of a flow curve its models. */
public final class CandidatesPart {
    private static final int[] SHARES = {68, 32};

    @Inject
    private Session session;

    @Inject
    private Looks looks;

    @Inject
    private CardsWindow cards;

    @Inject
    private Problems problems;

    @Inject
    private Pages pages;

    @Inject
    private FlowCurves flow;

    private Composite area;
    private final StackLayout onTop = new StackLayout();
    private Composite halves;
    private CandidateTable table;
    /** Made when its page is shown first. */
    private FlowBelow flowBelow;

    @PostConstruct
    void create(Composite parent) {
        area = parent;
        parent.setLayout(onTop);
        SashForm sash = looks.onPage(new SashForm(parent, SWT.HORIZONTAL | SWT.SMOOTH));
        sash.setSashWidth(Looks.STEP);
        table = new CandidateTable(sash, looks, session);
        new CardView(sash, looks, session, cards, problems);
        sash.setWeights(SHARES);
        halves = sash;
        onTop.topControl = halves;
        pages.onTurn(this::turn);
    }

    private void turn() {
        if (flowBelow == null && pages.current() == Page.FLOW_CURVE) {
            flowBelow = new FlowBelow(area, looks, session, flow);
        }
        onTop.topControl = pages.current() == Page.FLOW_CURVE ? flowBelow : halves;
        area.layout(true, true);
    }

    /** The table, unless somebody went for another control in here. */
    @Focus
    void focus() {
        for (Control at = area.getDisplay().getFocusControl(); at != null; at = at.getParent()) {
            if (at == area) {
                return;
            }
        }
        if (onTop.topControl == halves) {
            table.setFocus();
        } else {
            flowBelow.setFocus();
        }
    }
}
