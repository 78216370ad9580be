package stirwright.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import stirwright.workbench.internal.session.Page;
import stirwright.workbench.internal.session.Pages;

/** Turns to the case. */
public final class CasePageHandler {
    @Execute
    void run(Pages pages) {
        pages.turnTo(Page.CASE);
    }
}
