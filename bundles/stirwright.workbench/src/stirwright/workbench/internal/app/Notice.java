package stirwright.workbench.internal.app;

import java.util.List;

/**
 * Something that the window has to say, and what can be done about it.
 *
 * @param key one notice takes the place of another with the same key
 * @param action the verb of the button that settles it; the bar adds one that puts the notice away
 */
public record Notice(String key, String words, List<Action> actions) {

    /** @param deed called on the user interface's thread; the notice goes */
    public record Action(String verb, Runnable deed) {}

    public Notice {
        actions = List.copyOf(actions);
    }
}
