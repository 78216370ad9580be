package stirwright.workbench.internal.parts;

import jakarta.annotation.PostConstruct;
import jakarta.inject.Inject;
import java.util.Map;
import org.eclipse.e4.ui.di.Focus;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.ScrolledComposite;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import stirwright.workbench.internal.session.Pages;
import stirwright.workbench.internal.session.Problems;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Looks;

/** The case: fluid, vessel, impeller, speed or target, as fields that recalculate while one types; or its fluid alone. */
public final class CasePart {
    @Inject
    private Session session;

    @Inject
    private Looks looks;

    @Inject
    private Problems problems;

    @Inject
    private Pages pages;

    private ScrolledComposite scroller;
    private CaseForm form;

    @PostConstruct
    void create(Composite parent) {
        parent.setLayout(new FillLayout());
        scroller = looks.onPage(new ScrolledComposite(parent, SWT.V_SCROLL));
        scroller.setExpandHorizontal(true);
        scroller.setExpandVertical(true);
        scroller.setShowFocusedControl(true);
        scroller.addListener(SWT.Resize, e -> fit());
        rebuild();
        session.onStudy(this::showStudy);
        pages.onTurn(this::showStudy);
        session.onOutcome(this::showOutcome);
    }

    /** The fields themselves change with the family, the model and the parts of the study. */
    private void showStudy() {
        if (form.fits()) {
            form.refresh();
        } else {
            String focus = form.focused();
            Point origin = scroller.getOrigin();
            Map<String, String> unreadable = form.ofTheCaseAtHand() ? form.unreadable() : Map.of();
            rebuild();
            form.retype(unreadable);
            scroller.setOrigin(origin);
            form.focus(focus);
        }
    }

    private void showOutcome() {
        if (form.fits()) {
            form.showOutcome();
        } else {
            showStudy();
        }
    }

    private void rebuild() {
        scroller.setRedraw(false);
        if (form != null) {
            form.dropProblems();
            form.dispose();
        }
        form = new CaseForm(scroller, looks, session, problems, pages);
        form.addListener(SWT.Resize, this::resized);
        scroller.setContent(form);
        fit();
        form.showOutcome();
        scroller.setRedraw(true);
    }

    private void resized(Event event) {
        fit();
    }

    private void fit() {
        Control content = scroller.getContent();
        if (content != null) {
            scroller.setMinSize(content.computeSize(scroller.getClientArea().width, SWT.DEFAULT));
        }
    }

    @Focus
    void focus() {
        form.setFocus();
    }
}
