package stirwright.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.CanExecute;
import org.eclipse.e4.core.di.annotations.Execute;
import stirwright.workbench.internal.session.Session;

/** Takes the last step back. */
public final class UndoHandler {
    @CanExecute
    boolean can(Session session) {
        return session.editor().canUndo();
    }

    @Execute
    void run(Session session) {
        session.undo();
    }
}
