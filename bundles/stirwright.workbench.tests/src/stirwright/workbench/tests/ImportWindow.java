package stirwright.workbench.tests;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StyledText;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableItem;
import stirwright.workbench.internal.widgets.Names;

/** The import's dialog, used from another thread than its own. */
final class ImportWindow {
    private final OpenWindow window;
    private final Shell shell;

    private ImportWindow(OpenWindow window, Shell shell) {
        this.window = window;
        this.shell = shell;
    }

    /** Waits until it is open and has read its source. */
    static ImportWindow await(OpenWindow window) throws Exception {
        Shell[] found = new Shell[1];
        OpenWindow.await("the import", () -> {
            window.display().syncExec(() -> List.of(window.display().getShells()).stream()
                    .filter(s -> s.isVisible() && s.getText().startsWith("Import flow curve: ")).findFirst().ifPresent(s -> found[0] = s));
            return found[0] != null;
        });
        ImportWindow dialog = new ImportWindow(window, found[0]);
        dialog.settle();
        return dialog;
    }

    /** Its progress says nothing and something was read: there are points or messages. */
    void settle() throws Exception {
        for (int i = 0; i < 3; i++) {
            Thread.sleep(60);
            OpenWindow.await("the reading", () -> {
                boolean[] there = new boolean[1];
                window.display().syncExec(() -> there[0] = find(Table.class, "rows of the source").getItemCount() > 0
                        || !find(StyledText.class, "what to look at before taking anything").getText().isEmpty());
                return there[0];
            });
        }
    }

    void awaitEnd() throws Exception {
        OpenWindow.await("the end of the import", shell::isDisposed);
        window.settle();
    }

    <C extends Control> C find(Class<C> type, String name) {
        return all(type).stream().filter(c -> name.equals(Names.of(c))).findFirst()
                .orElseThrow(() -> new AssertionError("no " + type.getSimpleName() + " is called '" + name + "'"));
    }

    <C extends Control> List<C> all(Class<C> type) {
        List<C> found = new ArrayList<>();
        collect(shell, type, found);
        return found;
    }

    private static <C extends Control> void collect(Control control, Class<C> type, List<C> found) {
        if (type.isInstance(control)) {
            found.add(type.cast(control));
        }
        if (control instanceof Composite composite) {
            for (Control child : composite.getChildren()) {
                collect(child, type, found);
            }
        }
    }

    private Button button(String verb) {
        return all(Button.class).stream().filter(b -> b.getText().equals(verb)).findFirst()
                .orElseThrow(() -> new AssertionError("no button " + verb + " among " + all(Button.class).stream().map(Button::getText).toList()));
    }

    boolean canPress(String verb) throws Exception {
        return window.on(() -> button(verb).isEnabled());
    }

    void press(String verb) throws Exception {
        window.run(() -> {
            Button button = button(verb);
            if (!button.isEnabled()) {
                throw new AssertionError("button " + verb + " cannot be pressed");
            }
            button.notifyListeners(SWT.Selection, new Event());
        });
        if (!shell.isDisposed()) {
            settle();
        }
    }

    void choose(String list, String words) throws Exception {
        window.run(() -> {
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

    void type(String combo, String words) throws Exception {
        window.run(() -> find(Combo.class, combo).setText(words));
    }

    void check(String table, int row, boolean on) throws Exception {
        window.run(() -> {
            TableItem item = find(Table.class, table).getItem(row);
            // A virtual item fills itself when it is asked.
            item.getText(0);
            item.setChecked(on);
            Event event = new Event();
            event.item = item;
            event.detail = SWT.CHECK;
            find(Table.class, table).notifyListeners(SWT.Selection, event);
        });
        settle();
    }

    boolean checked(String table, int row) throws Exception {
        return window.on(() -> {
            TableItem item = find(Table.class, table).getItem(row);
            item.getText(0);
            return item.getChecked();
        });
    }

    double number(String table, int row, int column) throws Exception {
        return window.on(() -> Double.parseDouble(find(Table.class, table).getItem(row).getText(column)));
    }

    String words(String text) throws Exception {
        return window.on(() -> find(StyledText.class, text).getText());
    }

    void picture(String name) throws Exception {
        if (!canPress("Take these curves")) {
            throw new AssertionError("nothing can be taken yet");
        }
        LooksTest.picture(window, shell, name);
    }

    Shell shell() {
        return shell;
    }
}
