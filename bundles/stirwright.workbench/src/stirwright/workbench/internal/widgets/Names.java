package stirwright.workbench.internal.widgets;

import org.eclipse.swt.accessibility.AccessibleAdapter;
import org.eclipse.swt.accessibility.AccessibleEvent;
import org.eclipse.swt.widgets.Control;

/** Names controls for people who hear the window instead of seeing it. */
public final class Names {
    private static final String KEY = "stirwright.name";

    private Names() {}

    /** The name stays readable as data of the control, so that a test can ask for it. */
    public static <C extends Control> C name(C control, String name) {
        boolean first = control.getData(KEY) == null;
        control.setData(KEY, name);
        if (first) {
            control.getAccessible().addAccessibleListener(new AccessibleAdapter() {
                @Override
                public void getName(AccessibleEvent event) {
                    event.result = (String) control.getData(KEY);
                }
            });
        }
        return control;
    }

    /** The name given to a control; null without one. */
    public static String of(Control control) {
        return (String) control.getData(KEY);
    }
}
