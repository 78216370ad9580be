package stirwright.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import stirwright.workbench.internal.app.DropInNotices;

/** Asks again about declined bundles. */
public final class AskAgainHandler {
    @Execute
    void run(DropInNotices dropIns) {
        dropIns.askAgain();
    }
}
