package stirwright.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Table;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.osgi.framework.BundleContext;
import org.osgi.framework.FrameworkUtil;
import stirwright.core.Library;
import stirwright.trust.DropIns;
import stirwright.workbench.internal.session.Session;

/** Jars that are dropped into the folder while the window is open. */
class DropInTest {
    /** What the product promises from the drop to the sight. */
    private static final long PROMISED_NANOS = 2_000_000_000L;

    private final BundleContext bundles = FrameworkUtil.getBundle(Session.class).getBundleContext();
    private final DropIns dropIns = bundles.getService(bundles.getServiceReference(DropIns.class));
    private String sha256;

    @BeforeEach
    void begin() throws Exception {
        sha256 = DroppedJar.sha256(DroppedJar.bytes());
        dropIns.forget(sha256);
        System.clearProperty(DroppedFamily.RAN);
    }

    @AfterEach
    void end() throws Exception {
        for (var one : dropIns.list()) {
            Files.deleteIfExists(one.file());
        }
        dropIns.forget(sha256);
        OpenWindow.await("an empty folder", () -> dropIns.list().isEmpty() && !present());
    }

    private boolean present() {
        return bundles.getService(bundles.getServiceReference(Library.class)).catalogue().family(DroppedFamily.ID).isPresent();
    }

    @Test
    void anApprovedFamilyShowsInChartAndTableAndGoesWithItsFile() throws Exception {
        dropIns.approve(sha256);
        OpenWindow.use(List.of("demo", "--window"), window -> {
            long start = System.nanoTime();
            Path jar = DroppedJar.drop("paddle.jar", DroppedJar.bytes());
            OpenWindow.await("the family in the list", () -> offered(window));
            long shown = System.nanoTime() - start;
            assertTrue(shown < PROMISED_NANOS, () -> "shown after " + shown / 1_000_000 + " ms");
            System.out.println("a dropped family is offered after " + shown / 1_000_000 + " ms");
            window.choose("Family", DroppedFamily.TITLE);
            assertEquals("droppedpaddle.np.invented", window.outcome().rows().get(0).correlationId());
            assertEquals(2.5, window.outcome().rows().get(0).value(), 0.0);
            assertEquals(window.outcome().rows().size(), (int) window.on(() -> window.find(Table.class, "candidates").getItemCount()));
            assertTrue(window.outcome().picture().curves().stream().anyMatch(c -> c.id().equals("droppedpaddle/droppedpaddle.np.invented")));
            long gone = System.nanoTime();
            Files.delete(jar);
            OpenWindow.await("the family to go", () -> !offered(window));
            assertTrue(System.nanoTime() - gone < PROMISED_NANOS, "it stays too long");
            assertEquals("family", window.outcome().main().result().refusal().orElseThrow().field());
            assertEquals(0, (int) window.on(() -> window.find(Table.class, "candidates").getItemCount()));
            DroppedJar.drop("paddle.jar", DroppedJar.bytes());
            OpenWindow.await("the numbers to come back", () -> offered(window));
            assertEquals(2.5, window.outcome().rows().get(0).value(), 0.0);
        });
    }

    @Test
    void anUnknownOneAsksAndRunsOnlyAfterTheAnswer() throws Exception {
        OpenWindow.use(List.of("demo", "--window"), window -> {
            DroppedJar.drop("paddle.jar", DroppedJar.bytes());
            OpenWindow.await("the question", () -> said(window, sha256));
            assertTrue(said(window, "dropped.paddle 1.0.0"), "the question names the bundle");
            assertTrue(said(window, "all rights"), "the question says what an approval means");
            assertFalse(offered(window));
            assertNull(System.getProperty(DroppedFamily.RAN), "it ran unasked");
            window.press("Approve");
            OpenWindow.await("the family in the list", () -> offered(window));
            assertEquals("yes", System.getProperty(DroppedFamily.RAN));
            assertFalse(said(window, sha256), "the question stays");
        });
    }

    @Test
    void aDeclinedOneIsNotAskedAboutAgain() throws Exception {
        OpenWindow.use(List.of("demo", "--window"), window -> {
            DroppedJar.drop("paddle.jar", DroppedJar.bytes());
            OpenWindow.await("the question", () -> said(window, sha256));
            window.press("Decline");
            OpenWindow.await("its state", () -> dropIns.list().stream().anyMatch(d -> d.state().name().equals("DECLINED")));
            OpenWindow.await("the question to go", () -> !said(window, sha256));
        });
        OpenWindow.use(List.of("demo", "--window"), window -> {
            assertFalse(said(window, sha256), "it is asked about again");
            assertNull(System.getProperty(DroppedFamily.RAN));
        });
    }

    @Test
    void aCorruptOneIsTold() throws Exception {
        OpenWindow.use(List.of("demo", "--window"), window -> {
            DroppedJar.drop("torn.jar", "no jar at all".getBytes(StandardCharsets.UTF_8));
            OpenWindow.await("the message", () -> said(window, "torn.jar") && said(window, "of no use"));
            assertEquals(1, (int) window.on(() -> window.all(Button.class, b -> b.getText().equals("Put away")).size()));
        });
    }

    private static boolean offered(OpenWindow window) {
        boolean[] offered = new boolean[1];
        window.display().syncExec(() -> offered[0] = List.of(window.find(Combo.class, "Family").getItems())
                .contains(DroppedFamily.TITLE));
        return offered[0];
    }

    private static boolean said(OpenWindow window, String words) {
        boolean[] said = new boolean[1];
        window.display().syncExec(() -> said[0] = !window.all(Label.class, l -> l.isVisible() && l.getText().contains(words)).isEmpty());
        return said[0];
    }
}
