package stirwright.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.swt.widgets.Shell;
import stirwright.workbench.internal.app.Documents;

/** Opens a study. */
public final class OpenHandler {
    @Execute
    void run(Documents documents, Shell shell) {
        documents.open(shell);
    }
}
