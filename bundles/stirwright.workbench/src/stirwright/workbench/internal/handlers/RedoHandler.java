package stirwright.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.CanExecute;
import org.eclipse.e4.core.di.annotations.Execute;
import stirwright.workbench.internal.session.Session;

/** Does again what was undone. */
public final class RedoHandler {
    @CanExecute
    boolean can(Session session) {
        return session.editor().canRedo();
    }

    @Execute
    void run(Session session) {
        session.redo();
    }
}
