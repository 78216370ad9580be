package stirwright.workbench.internal.app;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Predicate;

/** What the window has to say at the moment, oldest first. On the user interface's thread. */
public final class Notices {
    private final Map<String, Notice> notices = new LinkedHashMap<>();
    private final List<Runnable> listeners = new ArrayList<>();

    public void put(Notice notice) {
        if (!notice.equals(notices.put(notice.key(), notice))) {
            tell();
        }
    }

    public void remove(String key) {
        if (notices.remove(key) != null) {
            tell();
        }
    }

    void removeIf(Predicate<String> unwanted) {
        if (notices.keySet().removeIf(unwanted)) {
            tell();
        }
    }

    Collection<Notice> all() {
        return List.copyOf(notices.values());
    }

    void listen(Runnable listener) {
        listeners.add(listener);
    }

    private void tell() {
        listeners.forEach(Runnable::run);
    }
}
