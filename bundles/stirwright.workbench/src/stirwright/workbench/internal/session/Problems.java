package stirwright.workbench.internal.session;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The fields whose text cannot be read, with the way to jump to each. */
public final class Problems {
    private final Map<String, Runnable> jumps = new LinkedHashMap<>();
    private final List<Runnable> listeners = new ArrayList<>();

    /**
     * @param column of the field
     * @param jump sets the focus on it
     */
    public void add(String column, Runnable jump) {
        jumps.put(column, jump);
        tell();
    }

    public void remove(String column) {
        if (jumps.remove(column) != null) {
            tell();
        }
    }

    public int count() {
        return jumps.size();
    }

    /** Goes to the first of them. */
    public void jump() {
        jumps.values().stream().findFirst().ifPresent(Runnable::run);
    }

    public void listen(Runnable listener) {
        listeners.add(listener);
    }

    private void tell() {
        listeners.forEach(Runnable::run);
    }
}
