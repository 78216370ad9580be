package stirwright.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import stirwright.workbench.internal.session.Page;
import stirwright.workbench.internal.session.Pages;

/** Turns to the flow curve of its fluid. */
public final class FlowCurvePageHandler {
    @Execute
    void run(Pages pages) {
        pages.turnTo(Page.FLOW_CURVE);
    }
}
