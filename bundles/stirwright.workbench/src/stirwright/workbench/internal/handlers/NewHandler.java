package stirwright.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.swt.widgets.Shell;
import stirwright.workbench.internal.app.Documents;

/** Starts a blank study. */
public final class NewHandler {
    @Execute
    void run(Documents documents, Shell shell) {
        documents.startNew(shell);
    }
}
