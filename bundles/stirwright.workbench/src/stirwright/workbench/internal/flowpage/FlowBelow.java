package stirwright.workbench.internal.flowpage;

import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.SashForm;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.widgets.Composite;
import stirwright.workbench.internal.flow.FlowCurves;
import stirwright.workbench.internal.flow.FlowSheet;
import stirwright.workbench.internal.flow.FluidEdits;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Looks;

/** Below the chart: the models, and the card of the selected one beside them. */
public final class FlowBelow extends Composite {
    private static final int[] SHARES = {70, 30};

    private final SashForm halves;
    private final ModelTable table;
    private final ModelView view;

    public FlowBelow(Composite parent, Looks looks, Session session, FlowCurves flow) {
        super(parent, SWT.NONE);
        looks.onPage(this);
        setLayout(new FillLayout());
        halves = looks.onPage(new SashForm(this, SWT.HORIZONTAL | SWT.SMOOTH));
        halves.setSashWidth(Looks.STEP);
        table = new ModelTable(halves, looks, flow);
        view = new ModelView(halves, looks, flow, new FluidEdits(session));
        halves.setWeights(SHARES);
        flow.sheet().ifPresent(this::show);
        flow.onSheet(() -> flow.sheet().ifPresent(this::show));
    }

    private void show(FlowSheet sheet) {
        // Without curves there is nothing to compare, and the chart says what to do.
        halves.setVisible(!sheet.empty());
        table.show(sheet);
        view.show(sheet);
    }

    @Override
    public boolean setFocus() {
        return table.setFocus();
    }
}
