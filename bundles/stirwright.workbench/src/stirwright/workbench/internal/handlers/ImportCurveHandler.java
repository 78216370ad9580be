package stirwright.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.swt.widgets.Shell;
import stirwright.workbench.internal.importing.CurveImports;

/** Asks for a file with flow curves and shows what is in it. */
public final class ImportCurveHandler {
    @Execute
    void run(CurveImports imports, Shell shell) {
        imports.choose(shell);
    }
}
