package stirwright.workbench.internal;

import jakarta.annotation.PostConstruct;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;

/** The case. */
public final class CasePart {
    @PostConstruct
    void create(Composite parent) {
        new Label(parent, SWT.NONE).setText("case");
    }
}
