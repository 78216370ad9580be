package stirwright.workbench.internal.app;

import java.util.List;
import org.eclipse.e4.core.contexts.ContextInjectionFactory;
import org.eclipse.e4.core.contexts.IEclipseContext;
import org.eclipse.e4.ui.model.application.MApplication;
import org.eclipse.e4.ui.workbench.lifecycle.PostContextCreate;
import org.eclipse.e4.ui.workbench.lifecycle.ProcessAdditions;
import org.eclipse.e4.ui.workbench.modeling.EModelService;
import org.eclipse.equinox.app.IApplicationContext;
import org.eclipse.swt.widgets.Display;
import stirwright.core.Library;
import stirwright.workbench.internal.flow.FlowCurves;
import stirwright.workbench.internal.importing.CurveImports;
import stirwright.workbench.internal.session.Pages;
import stirwright.workbench.internal.session.Problems;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Looks;

/** Puts together what the parts share, before there is a window. */
public final class LifeCycle {

    @PostContextCreate
    void start(IEclipseContext context, IApplicationContext application) {
        Display display = Display.getDefault();
        Notices notices = new Notices();
        Opening opening = Opening.of(arguments(application), notices);
        Session session = new Session(context.get(Library.class), task -> later(display, task), opening.study(), opening.file());
        context.set(Looks.class, new Looks(display));
        context.set(Notices.class, notices);
        context.set(Problems.class, new Problems());
        context.set(Session.class, session);
        Pages pages = new Pages();
        FlowCurves flow = new FlowCurves(session, pages, task -> later(display, task));
        context.set(Pages.class, pages);
        context.set(FlowCurves.class, flow);
        context.set(Documents.class, ContextInjectionFactory.make(Documents.class, context));
        context.set(CardsWindow.class, ContextInjectionFactory.make(CardsWindow.class, context));
        context.set(DropInNotices.class, ContextInjectionFactory.make(DropInNotices.class, context));
        context.set(CurveImports.class, ContextInjectionFactory.make(CurveImports.class, context));
        display.disposeExec(() -> {
            flow.close();
            session.close();
        });
    }

    /** Families go on arriving while the window closes. */
    private static void later(Display display, Runnable task) {
        if (!display.isDisposed()) {
            display.asyncExec(task);
        }
    }

    @ProcessAdditions
    void restore(MApplication application, EModelService models) {
        WindowSizes.restore(models, application.getChildren().get(0));
    }

    private static List<String> arguments(IApplicationContext application) {
        return application.getArguments().get(IApplicationContext.APPLICATION_ARGS) instanceof String[] arguments
                ? List.of(arguments) : List.of();
    }
}
