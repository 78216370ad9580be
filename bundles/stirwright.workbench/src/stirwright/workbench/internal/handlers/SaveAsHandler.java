package stirwright.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.swt.widgets.Shell;
import stirwright.workbench.internal.app.Documents;

/** Saves the study under another name. */
public final class SaveAsHandler {
    @Execute
    void run(Documents documents, Shell shell) {
        documents.saveAs(shell);
    }
}
