package stirwright.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.swt.widgets.Shell;
import stirwright.workbench.internal.app.Documents;

/** Saves the study. */
public final class SaveHandler {
    @Execute
    void run(Documents documents, Shell shell) {
        documents.save(shell);
    }
}
