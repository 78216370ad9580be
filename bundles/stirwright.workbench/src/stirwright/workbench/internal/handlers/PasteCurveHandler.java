package stirwright.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.swt.widgets.Shell;
import stirwright.workbench.internal.importing.CurveImports;

/** Shows what of the clipboard is a flow curve. */
public final class PasteCurveHandler {
    @Execute
    void run(CurveImports imports, Shell shell) {
        imports.paste(shell);
    }
}
