package stirwright.workbench.internal.importing;

import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Link;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.widgets.Looks;

/** Once reading takes long, it is told, with the way to stop it. */
final class Progress extends Composite {
    /** When work counts as long enough to be told. */
    private static final int LONG_MILLIS = 500;

    private final ImportSession session;
    private final Link words;
    private boolean slow;

    Progress(Composite parent, Looks looks, ImportSession session) {
        super(parent, SWT.NONE);
        this.session = session;
        setLayout(new FillLayout());
        words = looks.onPage(new Link(this, SWT.NONE));
        words.setLinkForeground(looks.palette().accent());
        words.addListener(SWT.Selection, e -> act());
        session.onRequest(this::watch);
        session.onReading(() -> {
            slow = false;
            show();
        });
    }

    private void watch() {
        slow &= session.busy();
        show();
        getDisplay().timerExec(LONG_MILLIS, () -> {
            if (!isDisposed() && session.busy()) {
                slow = true;
                show();
            }
        });
    }

    private void act() {
        if (slow) {
            session.stop();
        } else {
            session.choose(session.choice());
        }
    }

    private void show() {
        if (isDisposed()) {
            return;
        }
        String now = slow ? ImportWords.Progress_reading + " " + Looks.act(ImportWords.Progress_stop)
                : session.stopped() ? ImportWords.Progress_stopped + " " + Looks.act(ImportWords.Progress_again)
                : session.defect() != null ? Messages.bind(Messages.Standing_defect, plain(session.defect())) : "";
        if (!words.getText().equals(now)) {
            words.setText(now);
            words.requestLayout();
        }
    }

    private static String plain(Throwable defect) {
        return String.valueOf(defect).replace("&", "&&").replace('<', '(').replace('>', ')');
    }
}
