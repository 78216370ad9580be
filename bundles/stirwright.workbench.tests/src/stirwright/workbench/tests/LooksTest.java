package stirwright.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.ImageLoader;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Link;
import org.eclipse.swt.widgets.Sash;
import org.eclipse.swt.widgets.ScrollBar;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.Text;
import org.junit.jupiter.api.Test;
import stirwright.workbench.internal.session.View;
import stirwright.workbench.internal.widgets.Names;

/** How the window looks and is reached: pictures to look at, no text cut, names for those who hear it, the order of the keys. */
class LooksTest {
    static final List<String> DEMO = List.of("demo", "--window");
    private static final Path PICTURES = Path.of(System.getProperty("stirwright.pictures"));
    static final Point NORMAL = new Point(1280, 800);
    static final Point SMALL = new Point(1280, 720);

    @Test
    void pictures() throws Exception {
        OpenWindow.use(DEMO, window -> {
            size(window, NORMAL);
            for (View view : View.values()) {
                window.run(() -> window.session().show(view));
                picture(window, view.name().toLowerCase().replace('_', '-'));
            }
            window.run(() -> window.session().show(View.POWER_NUMBER));
            window.run(() -> window.session().turnTo(window.session().editor().study().getCases().get(3)));
            picture(window, "flagged");
            window.press("disc turbine");
            picture(window, "two-families");
            window.type("Density, kg/m3", "1.72 kg");
            picture(window, "unreadable");
            DroppedJar.drop("paddle.jar", DroppedJar.bytes());
            OpenWindow.await("the question", () -> asks(window));
            picture(window, "question");
            Files.delete(Path.of(System.getProperty("stirwright.families"), "paddle.jar"));
            OpenWindow.await("the question to go", () -> !asks(window));
        });
        assertTrue(Files.size(PICTURES.resolve("question" + zoom() + ".png")) > 10_000);
    }

    private static boolean asks(OpenWindow window) {
        boolean[] asks = new boolean[1];
        window.display().syncExec(() -> asks[0] = !window.all(Button.class, b -> b.getText().equals("Approve")).isEmpty());
        return asks[0];
    }

    @Test
    void noTextIsCut() throws Exception {
        OpenWindow.use(DEMO, window -> {
            for (Point size : List.of(NORMAL, SMALL)) {
                size(window, size);
                for (int i = 0; i < 5; i++) {
                    int at = i;
                    window.run(() -> window.session().turnTo(window.session().editor().study().getCases().get(at)));
                    window.settle();
                    assertEquals(List.of(), window.on(() -> cut(window)), "cut at " + size);
                    assertEquals(List.of(), window.on(() -> cutNumbers(window)), "cut at " + size);
                    assertEquals(List.of(), window.on(() -> overlapping(window)), "overlapping at " + size);
                }
            }
        });
    }

    /** Labels, links and buttons that are narrower than their words. */
    static List<String> cut(OpenWindow window) {
        return cut(window.all(Control.class, c -> true));
    }

    static List<String> cut(List<Control> controls) {
        List<String> cut = new ArrayList<>();
        for (Control control : controls.stream().filter(LooksTest::hasWords).toList()) {
            boolean wraps = (control.getStyle() & SWT.WRAP) != 0;
            Point needed = control.computeSize(wraps ? control.getSize().x : SWT.DEFAULT, SWT.DEFAULT);
            if (needed.x > control.getSize().x + 1 || needed.y > control.getSize().y + 1) {
                cut.add(words(control) + " needs " + needed + " and has " + control.getSize());
            }
        }
        return cut;
    }

    private static boolean hasWords(Control control) {
        return control.isVisible() && !words(control).isEmpty();
    }

    /** Numbers in fields, and in cells and heads of the table, that are wider than their place. */
    private static List<String> cutNumbers(OpenWindow window) {
        List<String> cut = new ArrayList<>();
        GC gc = new GC(window.shell());
        for (Text field : window.all(Text.class, t -> t.isVisible() && (t.getStyle() & SWT.RIGHT) != 0)) {
            gc.setFont(field.getFont());
            if (gc.textExtent(field.getText()).x > field.getClientArea().width) {
                cut.add(Names.of(field) + " " + field.getText());
            }
        }
        Table table = window.find(Table.class, "candidates");
        for (int c = 1; c < table.getColumnCount(); c++) {
            for (int r = 0; r < table.getItemCount(); r++) {
                gc.setFont(table.getItem(r).getFont());
                if (gc.textExtent(table.getItem(r).getText(c)).x > table.getColumn(c).getWidth()) {
                    cut.add(table.getColumn(c).getText() + " " + table.getItem(r).getText(c));
                }
            }
        }
        gc.dispose();
        return cut;
    }

    static String words(Control control) {
        return switch (control) {
            case Label label -> label.getText();
            case Link link -> link.getText();
            case Button button -> button.getText();
            default -> "";
        };
    }

    /** Neighbours in one composite that lie upon each other. */
    static List<String> overlapping(OpenWindow window) {
        List<String> found = new ArrayList<>();
        for (Composite composite : window.all(Composite.class, Composite::isVisible)) {
            Control[] children = composite.getChildren();
            for (int i = 0; i < children.length; i++) {
                for (int j = i + 1; j < children.length; j++) {
                    Rectangle both = children[i].getBounds().intersection(children[j].getBounds());
                    boolean lie = children[i].isVisible() && children[j].isVisible() && both.width > 1 && both.height > 1;
                    if (lie && !(children[i] instanceof Sash) && !(children[j] instanceof Sash)) {
                        found.add(children[i] + " and " + children[j] + " in " + composite);
                    }
                }
            }
        }
        return found;
    }

    @Test
    void nothingNeedsToBeScrolledSideways() throws Exception {
        OpenWindow.use(DEMO, window -> {
            size(window, SMALL);
            window.press("pitched-blade turbine");
            for (View view : View.values()) {
                window.run(() -> window.session().show(view));
                window.settle();
                window.run(() -> {
                    for (Composite composite : window.all(Composite.class, Composite::isVisible)) {
                        ScrollBar bar = composite.getHorizontalBar();
                        assertFalse(bar != null && bar.isVisible() && bar.getThumb() < bar.getMaximum() - bar.getMinimum(),
                                () -> view + ": " + composite + " must be scrolled");
                    }
                    Table table = window.find(Table.class, "candidates");
                    int width = List.of(table.getColumns()).stream().mapToInt(c -> c.getWidth()).sum();
                    assertTrue(width <= table.getClientArea().width, view + ": the columns are wider than the table");
                });
            }
        });
    }

    @Test
    void everyControlHasAName() throws Exception {
        OpenWindow.use(DEMO, window -> window.run(() -> {
            List<Control> reached = window.all(Control.class, LooksTest::takesKeys);
            assertTrue(reached.size() > 30, "only " + reached.size() + " controls are found");
            for (Control control : reached) {
                String name = Names.of(control) == null ? words(control) : Names.of(control);
                assertFalse(name.isBlank(), () -> control + " has no name");
            }
        }));
    }

    static boolean takesKeys(Control control) {
        return control instanceof Text || control instanceof Combo || control instanceof Button || control instanceof Table
                || control instanceof Link || control.getClass().getSimpleName().equals("StyledText")
                || control.getClass().getSimpleName().equals("WordBar") || control.getClass().getSimpleName().equals("ChartView");
    }

    @Test
    void theTabKeyGoesDownTheCase() throws Exception {
        OpenWindow.use(DEMO, window -> {
            size(window, NORMAL);
            window.run(() -> {
                List<Text> fields = window.all(Text.class, t -> Names.of(t) != null && !Names.of(t).startsWith("reason"));
                int last = Integer.MIN_VALUE;
                for (Text field : fields) {
                    int y = window.display().map(field, window.shell(), 0, 0).y;
                    assertTrue(y > last, Names.of(field) + " comes too late");
                    last = y;
                }
                fields.get(0).forceFocus();
                List<Text> walked = new ArrayList<>(List.of(fields.get(0)));
                for (int keys = 0; keys < 3 * fields.size() && walked.size() < fields.size(); keys++) {
                    window.display().getFocusControl().traverse(SWT.TRAVERSE_TAB_NEXT);
                    if (window.display().getFocusControl() instanceof Text text && fields.contains(text)) {
                        walked.add(text);
                    }
                }
                assertEquals(fields.stream().map(Names::of).toList(), walked.stream().map(Names::of).toList());
            });
        });
    }

    /** Without a window manager the frame is guessed, so the size is set until the area within has it. */
    static void size(OpenWindow window, Point size) throws Exception {
        Point[] asked = {size};
        OpenWindow.await("the size", () -> {
            boolean[] there = new boolean[1];
            window.display().syncExec(() -> {
                Rectangle inside = window.shell().getClientArea();
                there[0] = inside.width == size.x && inside.height == size.y;
                if (!there[0]) {
                    asked[0] = new Point(asked[0].x + size.x - inside.width, asked[0].y + size.y - inside.height);
                    window.shell().setBounds(0, 0, asked[0].x, asked[0].y);
                }
            });
            return there[0];
        });
        window.settle();
    }

    /** Keeps what the window shows, one dot for a dot of the screen. */
    static void picture(OpenWindow window, String name) throws Exception {
        window.settle();
        picture(window, window.shell(), name);
    }

    static void picture(OpenWindow window, Shell shell, String name) throws Exception {
        Files.createDirectories(PICTURES);
        // Whatever the new numbers still have to draw is drawn first.
        for (int i = 0; i < 10; i++) {
            window.run(() -> shell.update());
            Thread.sleep(20);
        }
        window.run(() -> {
            Rectangle area = window.display().map(shell, null, shell.getClientArea());
            GC screen = new GC(window.display());
            Image image = new Image(window.display(), area.width, area.height);
            screen.copyArea(image, area.x, area.y);
            ImageLoader file = new ImageLoader();
            file.data = new org.eclipse.swt.graphics.ImageData[] {image.getImageData(zoomPercent())};
            file.save(PICTURES.resolve(name + zoom() + ".png").toString(), SWT.IMAGE_PNG);
            image.dispose();
            screen.dispose();
        });
    }

    private static int zoomPercent() {
        return "2".equals(System.getenv("GDK_SCALE")) ? 200 : 100;
    }

    private static String zoom() {
        return "-" + zoomPercent();
    }
}
