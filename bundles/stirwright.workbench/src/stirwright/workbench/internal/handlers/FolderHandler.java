package stirwright.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import stirwright.workbench.internal.app.DropInNotices;

/** Shows the folder that bundles are dropped into. */
public final class FolderHandler {
    @Execute
    void run(DropInNotices dropIns) {
        dropIns.openFolder();
    }
}
