package stirwright.workbench.internal.app;

import jakarta.inject.Inject;
import org.eclipse.e4.core.di.annotations.Optional;
import org.eclipse.e4.ui.di.UIEventTopic;
import org.eclipse.e4.ui.model.application.MApplication;
import org.eclipse.e4.ui.model.application.ui.basic.MWindow;
import org.eclipse.e4.ui.workbench.UIEvents;
import org.eclipse.e4.ui.workbench.modeling.EModelService;
import org.eclipse.e4.ui.workbench.modeling.IWindowCloseHandler;
import org.eclipse.swt.widgets.Shell;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Looks;

/** Names the window after its study, asks before it closes, and remembers its sizes. */
public final class WindowAddon {
    @Inject
    private Session session;

    @Inject
    private Documents documents;

    @Inject
    private Looks looks;

    /** Called once the window stands. */
    @Inject
    @Optional
    void started(@UIEventTopic(UIEvents.UILifeCycle.APP_STARTUP_COMPLETE) org.osgi.service.event.Event event,
            MApplication application, EModelService models) {
        MWindow window = application.getChildren().get(0);
        Shell shell = (Shell) window.getWidget();
        looks.onPage(shell);
        window.getContext().set(IWindowCloseHandler.class, w -> mayClose(shell, models, window));
        session.onStudy(() -> name(window));
        name(window);
    }

    private boolean mayClose(Shell shell, EModelService models, MWindow window) {
        if (!documents.mayDrop(shell)) {
            return false;
        }
        Recent.note(session.file());
        WindowSizes.note(models, window);
        return true;
    }

    private void name(MWindow window) {
        String title = Documents.title(session.editor().study(), session.file());
        window.setLabel((session.editor().isDirty() ? "*" : "") + Messages.bind(Messages.Window_title, title));
    }
}
