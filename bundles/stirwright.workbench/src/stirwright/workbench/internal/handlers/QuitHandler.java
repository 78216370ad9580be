package stirwright.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.swt.widgets.Shell;

/** Closes the window as its frame does, so that it asks first about changes. */
public final class QuitHandler {
    @Execute
    void run(Shell shell) {
        shell.close();
    }
}
