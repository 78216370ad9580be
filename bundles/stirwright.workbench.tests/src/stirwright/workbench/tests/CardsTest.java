package stirwright.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.net.URI;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicReference;
import org.eclipse.swt.SWT;
import org.eclipse.swt.SWTError;
import org.eclipse.swt.browser.Browser;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Link;
import org.eclipse.swt.widgets.MenuItem;
import org.eclipse.swt.widgets.Shell;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.osgi.framework.BundleContext;
import org.osgi.framework.FrameworkUtil;
import stirwright.correlation.Correlation;
import stirwright.trust.DropIns;
import stirwright.workbench.internal.session.Row;
import stirwright.workbench.internal.session.Session;

/** The cards in the window's help. */
class CardsTest {
    private static final List<String> DEMO = List.of("demo", "--window");
    private static final String INDEX = "Correlation cards";

    private final BundleContext bundles = FrameworkUtil.getBundle(Session.class).getBundleContext();
    private final DropIns dropIns = bundles.getService(bundles.getServiceReference(DropIns.class));

    @BeforeEach
    @AfterEach
    void nothingIsDropped() throws Exception {
        for (var one : dropIns.list()) {
            Files.deleteIfExists(one.file());
        }
        dropIns.forget(DroppedJar.sha256(DroppedJar.bytes()));
    }

    @Test
    void theMenuOpensTheIndexAndTheCandidateItsCard() throws Exception {
        AtomicReference<String> without = new AtomicReference<>();
        AtomicReference<Path> folder = new AtomicReference<>();
        OpenWindow.use(DEMO, window -> {
            window.run(() -> without.set(noEngine(window)));
            if (without.get() == null) {
                help(window);
                Path index = shows(window, INDEX);
                folder.set(index.getParent());
                Row row = window.outcome().rows().get(0);
                Correlation picked = row.correlation().orElseThrow();
                window.run(() -> window.find(Link.class, "full card of the selected candidate").notifyListeners(SWT.Selection, new Event()));
                String title = picked.title().substring(0, 1).toUpperCase() + picked.title().substring(1);
                Path card = shows(window, title + ", " + picked.quantity().title());
                assertEquals(index.resolveSibling("card-" + picked.id() + ".html"), card);
                assertEquals(1, window.on(() -> shells(window)).intValue(), "a second shell opened");
                help(window);
                shows(window, INDEX);
            } else {
                help(window);
                OpenWindow.await("the window to say that it has no engine", () -> says(window, "no browser engine"));
            }
        });
        assumeTrue(without.get() == null, () -> "no browser engine for the window (on Debian libwebkit2gtk-4.1-0): " + without.get());
        OpenWindow.await("the temporary folder to go", () -> !Files.exists(folder.get()));
    }

    @Test
    void theDroppedFamilyHasItsCard() throws Exception {
        AtomicReference<String> without = new AtomicReference<>();
        OpenWindow.use(DEMO, window -> {
            window.run(() -> without.set(noEngine(window)));
            if (without.get() == null) {
                help(window);
                Path index = shows(window, INDEX);
                assertTrue(!Files.readString(index).contains("dropped"), "it is there before it was dropped");
                window.run(() -> engine(cards(window).orElseThrow()).setUrl(index.toUri() + "#quantities"));
                Path jar = DroppedJar.drop("cards.jar", DroppedJar.bytes());
                OpenWindow.await("the question", () -> asks(window));
                window.press("Approve");
                OpenWindow.await("its card", () -> holds(index, "dropped"));
                OpenWindow.await("the new index in the shell", () -> evaluates(window, "return document.body.textContent.includes('dropped');"));
                assertTrue(window.on(() -> engine(cards(window).orElseThrow()).getUrl()).endsWith("#quantities"), "it lost the place");
                Files.delete(jar);
                OpenWindow.await("its card to go", () -> !holds(index, "dropped"));
            }
        });
        assumeTrue(without.get() == null, () -> "no browser engine for the window (on Debian libwebkit2gtk-4.1-0): " + without.get());
    }

    private static boolean holds(Path index, String words) {
        try {
            return Files.readString(index).contains(words);
        } catch (IOException beingWritten) {
            return false;
        }
    }

    private static boolean says(OpenWindow window, String words) {
        boolean[] says = new boolean[1];
        window.display().syncExec(() -> says[0] = !window.all(Label.class, label -> label.getText().contains(words)).isEmpty());
        return says[0];
    }

    private static boolean asks(OpenWindow window) {
        boolean[] asks = new boolean[1];
        window.display().syncExec(() -> asks[0] = !window.all(Button.class,
                b -> b.getText().equals("Approve")).isEmpty());
        return asks[0];
    }

    /** What the toolkit says where it has no browser engine; null where it has one. */
    private static String noEngine(OpenWindow window) {
        Shell probe = new Shell(window.display());
        try {
            new Browser(probe, SWT.NONE);
            return null;
        } catch (SWTError none) {
            return none.getMessage();
        } finally {
            probe.dispose();
        }
    }

    private static void help(OpenWindow window) throws Exception {
        window.run(() -> {
            var help = Arrays.stream(window.shell().getMenuBar().getItems()).filter(i -> i.getText().contains("Help")).findFirst()
                    .orElseThrow().getMenu();
            help.notifyListeners(SWT.Show, new Event());
            MenuItem item = Arrays.stream(help.getItems()).filter(i -> i.getText().startsWith("Correlation &cards")).findFirst()
                    .orElseThrow(() -> new AssertionError("no item for the cards"));
            item.notifyListeners(SWT.Selection, new Event());
        });
    }

    /** Waits until the shell of the cards has a title, which is the page's own; gives the page's file. */
    private static Path shows(OpenWindow window, String title) throws Exception {
        Path[] page = new Path[1];
        OpenWindow.await("the page " + title, () -> {
            window.display().syncExec(() -> page[0] = cards(window).filter(shell -> shell.getText().equals(title))
                    .map(CardsTest::loaded).orElse(null));
            return page[0] != null;
        });
        return page[0];
    }

    /** The page itself must have come; the shell has the index's title before that. */
    private static Path loaded(Shell shell) {
        Browser browser = engine(shell);
        String url = browser.getUrl();
        Object heading = url.startsWith("file:") ? browser.evaluate("return document.title;") : "";
        return shell.getText().equals(heading) ? Path.of(URI.create(url)) : null;
    }

    private static Browser engine(Shell shell) {
        return (Browser) Arrays.stream(shell.getChildren()).filter(Browser.class::isInstance).findFirst().orElseThrow();
    }

    private static boolean evaluates(OpenWindow window, String script) {
        boolean[] answer = new boolean[1];
        window.display().syncExec(() -> answer[0] = Boolean.TRUE.equals(engine(cards(window).orElseThrow()).evaluate(script)));
        return answer[0];
    }

    private static int shells(OpenWindow window) {
        return (int) Arrays.stream(window.shell().getShells()).filter(CardsTest::hasBrowser).count();
    }

    private static Optional<Shell> cards(OpenWindow window) {
        return Arrays.stream(window.shell().getShells()).filter(CardsTest::hasBrowser).findFirst();
    }

    private static boolean hasBrowser(Shell shell) {
        return Arrays.stream(shell.getChildren()).anyMatch(Browser.class::isInstance);
    }
}
