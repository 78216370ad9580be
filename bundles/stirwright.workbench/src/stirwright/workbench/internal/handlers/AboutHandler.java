package stirwright.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.swt.widgets.Shell;

/** Says what this is and which keys there are. */
public final class AboutHandler {
    @Execute
    void run(Shell shell) {
        About.show(shell);
    }
}
