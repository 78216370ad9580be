package stirwright.workbench.internal.session;

import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;

/** Which page the window shows. On the user interface's thread. */
public final class Pages {
    private final List<Runnable> listeners = new CopyOnWriteArrayList<>();
    private Page current = Page.CASE;

    public Page current() {
        return current;
    }

    public void turnTo(Page page) {
        if (page != current) {
            current = page;
            listeners.forEach(Runnable::run);
        }
    }

    /** Called after each turning of a page. */
    public void onTurn(Runnable listener) {
        listeners.add(listener);
    }
}
