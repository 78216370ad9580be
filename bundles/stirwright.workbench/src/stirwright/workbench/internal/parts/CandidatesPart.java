package stirwright.workbench.internal.parts;

import jakarta.annotation.PostConstruct;
import jakarta.inject.Inject;
import org.eclipse.e4.ui.di.Focus;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.SashForm;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import stirwright.workbench.internal.app.CardsWindow;
import stirwright.workbench.internal.session.Problems;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Looks;

/** The candidates for the quantity on the chart, and the card of the selected one beside them. */
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

    private Composite area;
    private CandidateTable table;

    @PostConstruct
    void create(Composite parent) {
        area = parent;
        parent.setLayout(new FillLayout());
        SashForm halves = looks.onPage(new SashForm(parent, SWT.HORIZONTAL | SWT.SMOOTH));
        halves.setSashWidth(Looks.STEP);
        table = new CandidateTable(halves, looks, session);
        new CardView(halves, looks, session, cards, problems);
        halves.setWeights(SHARES);
    }

    /** The table, unless somebody went for another control in here. */
    @Focus
    void focus() {
        for (Control at = area.getDisplay().getFocusControl(); at != null; at = at.getParent()) {
            if (at == area) {
                return;
            }
        }
        table.setFocus();
    }
}
