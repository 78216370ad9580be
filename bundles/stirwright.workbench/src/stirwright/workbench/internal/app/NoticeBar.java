package stirwright.workbench.internal.app;

import jakarta.annotation.PostConstruct;
import jakarta.inject.Inject;
import java.util.Iterator;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;

/** A strip across the top that asks and tells without standing in the way; gone while there is nothing. */
public final class NoticeBar {
    @Inject
    private Looks looks;

    @Inject
    private Notices notices;

    private Composite bar;

    @PostConstruct
    void create(Composite parent) {
        bar = Names.name(new Wide(parent), Messages.Notice_name);
        bar.setBackground(looks.palette().surface());
        bar.setBackgroundMode(SWT.INHERIT_FORCE);
        GridLayout layout = new GridLayout(2, false);
        layout.marginWidth = 3 * Looks.STEP;
        layout.marginHeight = 0;
        layout.verticalSpacing = Looks.STEP;
        bar.setLayout(layout);
        notices.listen(this::show);
        show();
    }

    private void show() {
        if (bar.isDisposed()) {
            return;
        }
        for (Control old : bar.getChildren()) {
            old.dispose();
        }
        for (Iterator<Notice> all = notices.all().iterator(); all.hasNext();) {
            add(all.next());
        }
        bar.requestLayout();
        bar.getShell().layout(true, true);
    }

    private void add(Notice notice) {
        Label words = new Label(bar, SWT.WRAP);
        words.setText(Looks.literal(notice.words()));
        words.setForeground(looks.palette().text());
        GridData data = new GridData(SWT.FILL, SWT.CENTER, true, false);
        data.widthHint = 100;
        words.setLayoutData(data);
        Composite buttons = new Composite(bar, SWT.NONE);
        GridLayout layout = new GridLayout(notice.actions().size() + 1, false);
        layout.marginHeight = Looks.STEP;
        buttons.setLayout(layout);
        for (Notice.Action action : notice.actions()) {
            looks.button(buttons, action.verb(), () -> {
                notices.remove(notice.key());
                action.deed().run();
            });
        }
        if (notice.actions().isEmpty()) {
            looks.button(buttons, Messages.Notice_putAway, () -> notices.remove(notice.key()));
        }
    }
}
