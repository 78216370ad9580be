package stirwright.workbench.internal.app;

import jakarta.annotation.PostConstruct;
import jakarta.inject.Inject;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Link;
import stirwright.core.CaseResult;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.flow.FlowCurves;
import stirwright.workbench.internal.session.Problems;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Looks;

/** The line at the bottom that never goes: an estimate, and who is responsible; beside it how the case stands. */
public final class StandingLine {
    /** When work counts as long enough to be told. */
    private static final int LONG_MILLIS = 500;

    @Inject
    private Session session;

    @Inject
    private FlowCurves flow;

    @Inject
    private Problems problems;

    @Inject
    private Looks looks;

    private Link state;
    /** Whether the work at hand has taken long. */
    private boolean slow;

    @PostConstruct
    void create(Composite parent) {
        Composite line = looks.area(parent);
        GridLayout layout = new GridLayout(2, false);
        layout.marginWidth = 3 * Looks.STEP;
        layout.marginHeight = Looks.STEP;
        line.setLayout(layout);
        Label standing = looks.quiet(line, SWT.NONE, Messages.Standing_line);
        standing.setFont(looks.small());
        standing.setToolTipText(Messages.Standing_line);
        GridData data = new GridData(SWT.FILL, SWT.CENTER, true, false);
        data.widthHint = 100;
        standing.setLayoutData(data);
        state = looks.onPage(new Link(line, SWT.NONE));
        state.setLinkForeground(looks.palette().accent());
        state.addListener(SWT.Selection, e -> act());
        problems.listen(this::show);
        session.onRequest(() -> watch(line.getDisplay()));
        session.onOutcome(this::arrived);
        flow.onRequest(() -> watch(line.getDisplay()));
        flow.onSheet(this::arrived);
        show();
    }

    private void arrived() {
        slow &= busy();
        show();
    }

    private boolean busy() {
        return session.busy() || flow.busy();
    }

    /** Once work takes long, it is told, with the way to stop it. */
    private void watch(Display display) {
        slow &= busy();
        show();
        display.timerExec(LONG_MILLIS, () -> {
            if (!state.isDisposed() && busy()) {
                slow = true;
                show();
            }
        });
    }

    private void act() {
        if (slow) {
            stop();
        } else if (session.stopped()) {
            session.recalculate();
        } else if (flow.stopped()) {
            flow.again();
        } else {
            problems.jump();
        }
    }

    private void stop() {
        if (session.busy()) {
            session.stop();
        }
        if (flow.busy()) {
            flow.stop();
        }
    }

    private void show() {
        if (state.isDisposed()) {
            return;
        }
        String words = words();
        if (!state.getText().equals(words)) {
            state.setText(words);
            state.requestLayout();
        }
    }

    private String words() {
        if (slow) {
            return Messages.Standing_busy + " <a>" + Messages.Standing_stop + "</a>";
        }
        if (session.stopped() || flow.stopped()) {
            return Messages.Standing_stopped + " <a>" + Messages.Standing_again + "</a>";
        }
        if (problems.count() > 0) {
            return "<a>" + Messages.bind(Messages.Standing_problems, problems.count()) + "</a>";
        }
        Throwable defect = session.defect() == null ? flow.defect() : session.defect();
        if (defect != null) {
            return plain(Messages.bind(Messages.Standing_defect, String.valueOf(defect)));
        }
        return session.outcome().map(o -> status(o.main().result())).orElse("");
    }

    /** A link's text without its marks. */
    private static String plain(String words) {
        return words.replace("&", "&&").replace('<', '(').replace('>', ')');
    }

    private static String status(CaseResult result) {
        String name = plain(result.name());
        return name.isEmpty() ? "" : switch (result.status()) {
            case OK -> Messages.bind(Messages.Standing_ok, name);
            case FLAGGED -> Messages.bind(result.flags().size() == 1 ? Messages.Standing_flaggedOnce : Messages.Standing_flagged,
                    name, result.flags().size());
            case REFUSED -> Messages.bind(Messages.Standing_refused, name);
        };
    }
}
