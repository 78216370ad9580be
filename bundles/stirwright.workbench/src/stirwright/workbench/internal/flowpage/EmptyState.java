package stirwright.workbench.internal.flowpage;

import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import stirwright.workbench.internal.widgets.Looks;

/** In place of a chart without points: what to do next, with one link. */
public final class EmptyState extends Composite {
    private static final int WIDTH = 100 * Looks.STEP;

    private final Label words;

    /** @param act the words of the link */
    public EmptyState(Composite parent, Looks looks, String act, Runnable action) {
        super(parent, SWT.NONE);
        looks.onPage(this);
        setBackgroundMode(SWT.INHERIT_FORCE);
        setLayout(new GridLayout(1, false));
        words = looks.quiet(this, SWT.WRAP | SWT.CENTER, "");
        GridData data = new GridData(SWT.CENTER, SWT.BOTTOM, true, true);
        data.widthHint = WIDTH;
        words.setLayoutData(data);
        looks.link(this, act, action).setLayoutData(new GridData(SWT.CENTER, SWT.TOP, true, true));
    }

    public void say(String sentence) {
        if (!words.getText().equals(Looks.literal(sentence))) {
            words.setText(Looks.literal(sentence));
            words.requestLayout();
        }
    }
}
