package stirwright.workbench.internal.app;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.widgets.Composite;

/** As high as what is in it needs at the width of the window, which is what a trim gives it; nothing while it is empty. */
final class Wide extends Composite {
    Wide(Composite parent) {
        super(parent, SWT.NONE);
    }

    @Override
    public Point computeSize(int widthHint, int heightHint, boolean changed) {
        if (getChildren().length == 0) {
            return new Point(1, 0);
        }
        int width = getShell().getClientArea().width;
        return new Point(width, super.computeSize(width, heightHint, changed).y);
    }
}
