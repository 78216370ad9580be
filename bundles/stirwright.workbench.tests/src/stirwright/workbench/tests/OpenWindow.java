package stirwright.workbench.tests;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.function.BooleanSupplier;
import java.util.function.Predicate;
import org.eclipse.e4.ui.internal.workbench.swt.AbstractPartRenderer;
import org.eclipse.e4.ui.internal.workbench.swt.E4Application;
import org.eclipse.e4.ui.model.application.ui.basic.MWindow;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.swt.widgets.Text;
import stirwright.workbench.internal.session.Outcome;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Names;

/** The whole application, used from another thread than its own, as a user would. */
final class OpenWindow {
    private static final Duration PATIENCE = Duration.ofSeconds(20);

    private final Display display;
    private final Shell shell;
    private final Session session;

    /** What a test does with the window. */
    interface Script {
        void run(OpenWindow window) throws Exception;
    }

    private OpenWindow(Display display, Shell shell, Session session) {
        this.display = display;
        this.shell = shell;
        this.session = session;
    }

    /** Starts the application with arguments, runs the script beside it and closes it; what the script throws is thrown. */
    static void use(List<String> arguments, Script script) throws Exception {
        List<Throwable> failures = new ArrayList<>();
        Thread user = Thread.ofPlatform().name("user").daemon().start(() -> {
            OpenWindow window = null;
            try {
                window = waitForIt();
                window.settle();
                script.run(window);
            } catch (Throwable failure) {
                // Whatever it is, it belongs to the test's own thread.
                failures.add(failure);
            } finally {
                close(window);
            }
        });
        new E4Application().start(new StandIn(arguments));
        user.join();
        if (!failures.isEmpty()) {
            throw new AssertionError(failures.get(0).getMessage(), failures.get(0));
        }
    }

    private static OpenWindow waitForIt() throws InterruptedException {
        OpenWindow[] found = new OpenWindow[1];
        await("the window", () -> {
            Display display = Display.findDisplay(mainThread());
            if (display != null && !display.isDisposed()) {
                display.syncExec(() -> {
                    for (Shell shell : display.getShells()) {
                        if (shell.isVisible() && shell.getData(AbstractPartRenderer.OWNING_ME) instanceof MWindow window
                                && window.getContext().get(Session.class) != null) {
                            found[0] = new OpenWindow(display, shell, window.getContext().get(Session.class));
                        }
                    }
                });
            }
            return found[0] != null;
        });
        return found[0];
    }

    private static Thread mainThread() {
        return Thread.getAllStackTraces().keySet().stream().filter(t -> Display.findDisplay(t) != null).findFirst().orElse(null);
    }

    private static void close(OpenWindow window) {
        if (window == null) {
            Display display = Display.findDisplay(mainThread());
            if (display != null) {
                display.syncExec(() -> List.of(display.getShells()).forEach(Shell::dispose));
            }
            return;
        }
        window.display.syncExec(() -> {
            if (!window.shell.isDisposed()) {
                window.session.editor().markSaved();
                window.shell.close();
            }
        });
    }

    /** Waits until something holds; fails with words for it. */
    static void await(String what, BooleanSupplier holds) throws InterruptedException {
        await(what, PATIENCE, holds);
    }

    /** The same for what takes longer. */
    static void await(String what, Duration patience, BooleanSupplier holds) throws InterruptedException {
        long end = System.nanoTime() + patience.toNanos();
        while (!holds.getAsBoolean()) {
            if (System.nanoTime() > end) {
                throw new AssertionError("waited in vain for " + what);
            }
            Thread.sleep(5);
        }
    }

    /** Runs something on the window's thread. */
    <T> T on(Callable<T> work) throws Exception {
        List<T> result = new ArrayList<>();
        List<Throwable> failures = new ArrayList<>();
        display.syncExec(() -> {
            try {
                result.add(work.call());
            } catch (Throwable failure) {
                // An assertion too must come back to the test.
                failures.add(failure);
            }
        });
        if (!failures.isEmpty()) {
            throw new AssertionError(failures.get(0).getMessage(), failures.get(0));
        }
        return result.get(0);
    }

    void run(Runnable work) throws Exception {
        on(() -> {
            work.run();
            return null;
        });
    }

    /** Waits until the newest numbers are shown. */
    void settle() throws Exception {
        await("the numbers", () -> {
            boolean[] settled = new boolean[1];
            display.syncExec(() -> settled[0] = session.outcome().isPresent() && !session.busy());
            return settled[0];
        });
        if (session.defect() != null) {
            throw new AssertionError("a calculation failed", session.defect());
        }
    }

    Session session() {
        return session;
    }

    Shell shell() {
        return shell;
    }

    Display display() {
        return display;
    }

    Outcome outcome() throws Exception {
        settle();
        return on(() -> session.outcome().orElseThrow());
    }

    /** Types into a field in place of what stands there, and waits for the numbers. */
    void type(String field, String words) throws Exception {
        run(() -> {
            Text text = find(Text.class, field);
            text.setFocus();
            text.setText(words);
        });
        settle();
    }

    /** Types letter by letter in place of what stands there; where the letters go is where the focus is after each. */
    void typeLetters(String field, String words) throws Exception {
        run(() -> {
            Text text = find(Text.class, field);
            if (!text.forceFocus()) {
                throw new AssertionError(field + " does not take the focus, enabled: " + text.isEnabled() + ", visible: "
                        + text.isVisible() + ", at " + text.getBounds());
            }
            text.selectAll();
        });
        for (char letter : words.toCharArray()) {
            run(() -> {
                if (!(display.getFocusControl() instanceof Text text)) {
                    throw new AssertionError("the focus went to " + display.getFocusControl() + " at '" + letter + "'");
                }
                text.insert(String.valueOf(letter));
            });
            settle();
        }
    }

    /** Chooses in a list, as by hand. */
    void choose(String list, String words) throws Exception {
        run(() -> {
            Combo combo = find(Combo.class, list);
            int index = combo.indexOf(words);
            if (index < 0) {
                throw new AssertionError(list + " has no " + words + ": " + List.of(combo.getItems()));
            }
            combo.select(index);
            combo.notifyListeners(SWT.Selection, new Event());
        });
        settle();
    }

    /** Presses a button, or switches a check mark. */
    void press(String verb) throws Exception {
        run(() -> {
            Button button = all(Button.class, b -> b.getText().equals(verb)).stream().findFirst()
                    .orElseThrow(() -> new AssertionError("no button " + verb));
            if (!button.isEnabled()) {
                throw new AssertionError("button " + verb + " cannot be pressed");
            }
            if ((button.getStyle() & SWT.CHECK) != 0) {
                button.setSelection(!button.getSelection());
            }
            button.notifyListeners(SWT.Selection, new Event());
        });
        settle();
    }

    /** The control of that name. On the window's thread. */
    <C extends Control> C find(Class<C> type, String name) {
        List<C> found = all(type, c -> name.equals(Names.of(c)));
        if (found.isEmpty()) {
            throw new AssertionError("no " + type.getSimpleName() + " is called '" + name + "'");
        }
        return found.get(0);
    }

    /** All controls of a kind in the window, in the order of their creation. On the window's thread. */
    <C extends Control> List<C> all(Class<C> type, Predicate<C> which) {
        List<C> found = new ArrayList<>();
        collect(shell, type, which, found);
        return found;
    }

    private static <C extends Control> void collect(Control control, Class<C> type, Predicate<C> which, List<C> found) {
        if (type.isInstance(control) && which.test(type.cast(control))) {
            found.add(type.cast(control));
        }
        if (control instanceof Composite composite) {
            for (Control child : composite.getChildren()) {
                collect(child, type, which, found);
            }
        }
    }
}
