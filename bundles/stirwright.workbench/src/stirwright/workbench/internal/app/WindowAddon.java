package stirwright.workbench.internal.app;

import jakarta.annotation.PostConstruct;
import jakarta.inject.Inject;
import java.util.Optional;
import org.eclipse.e4.ui.model.application.MApplication;
import org.eclipse.e4.ui.model.application.ui.basic.MWindow;
import org.eclipse.e4.ui.model.application.ui.menu.MMenu;
import org.eclipse.e4.ui.model.application.ui.menu.MMenuElement;
import org.eclipse.e4.ui.workbench.modeling.EModelService;
import org.eclipse.e4.ui.workbench.modeling.IWindowCloseHandler;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Shell;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.importing.CurveImports;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Looks;

/** Names the window after its study, asks before it closes, and remembers its sizes. */
public final class WindowAddon {
    /** What the zones need to show every digit. In points. */
    private static final int LEAST_WIDTH = 1180;
    private static final int LEAST_HEIGHT = 640;
    private static final int AFTER_START = 400;

    @Inject
    private Session session;

    @Inject
    private Documents documents;

    @Inject
    private Looks looks;

    @Inject
    private CurveImports imports;

    /** The window is made after its addons and before the first event; that is when the rest is done. */
    @PostConstruct
    void begin(MApplication application, EModelService models) {
        Display.getCurrent().asyncExec(() -> started(application.getChildren().get(0), models));
    }

    private void started(MWindow window, EModelService models) {
        if (!(window.getWidget() instanceof Shell shell) || shell.isDisposed()) {
            return;
        }
        looks.onPage(shell);
        shell.setMinimumSize(LEAST_WIDTH, LEAST_HEIGHT);
        window.getContext().set(IWindowCloseHandler.class, w -> mayClose(shell, models, window));
        shell.getDisplay().timerExec(AFTER_START, () -> takeDrops(shell));
        session.onStudy(() -> name(shell, window));
        name(shell, window);
    }

    /** Once the window is there, since nobody drops a file on it before. */
    private void takeDrops(Shell shell) {
        if (!shell.isDisposed()) {
            new FileDrops(shell, documents, imports);
        }
    }

    private boolean mayClose(Shell shell, EModelService models, MWindow window) {
        if (!documents.mayDrop(shell)) {
            return false;
        }
        Recent.note(session.file());
        WindowSizes.note(models, window);
        return true;
    }

    private void name(Shell shell, MWindow window) {
        String title = Documents.title(session.editor().study(), session.file());
        shell.setText((session.editor().isDirty() ? "*" : "") + Messages.bind(Messages.Window_title, title));
        label(window, "undo", Messages.Menu_undo, session.editor().undoLabel());
        label(window, "redo", Messages.Menu_redo, session.editor().redoLabel());
    }

    /** Says in the menu what would be undone or done again. */
    private static void label(MWindow window, String id, String verb, Optional<String> step) {
        for (MMenuElement menu : window.getMainMenu().getChildren()) {
            for (MMenuElement item : ((MMenu) menu).getChildren()) {
                if (item.getElementId().equals("stirwright.workbench.item." + id)) {
                    item.setLabel(step.map(s -> verb + " " + s).orElse(verb));
                }
            }
        }
    }
}
