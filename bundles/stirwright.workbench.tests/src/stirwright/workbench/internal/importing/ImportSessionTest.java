package stirwright.workbench.internal.importing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import stirwright.exchange.CurveSource;
import stirwright.exchange.DecimalSign;
import stirwright.exchange.ImportChoice;

/** A source is read on another thread; the newest choice counts, and reading can be given up. */
class ImportSessionTest {
    private static final String TABLE = "shear rate (1/s);shear stress (Pa)\n1,5;9\n10,5;12\n100,5;20\n200,5;25\n";

    /** Stands in for the thread of the window. */
    private final BlockingQueue<Runnable> ui = new LinkedBlockingQueue<>();
    private final CountDownLatch held = new CountDownLatch(1);

    private CurveSource slow() {
        try {
            held.await();
        } catch (InterruptedException ended) {
            Thread.currentThread().interrupt();
        }
        return CurveSource.clipboard(TABLE);
    }

    private void runOne() throws InterruptedException {
        Runnable task = ui.poll(20, TimeUnit.SECONDS);
        assertTrue(task != null, "nothing came back");
        task.run();
    }

    @Test
    void whatTakesTooLongIsGivenUpAndReadAgain() throws InterruptedException {
        try (ImportSession session = new ImportSession("slow", this::slow, ui::add)) {
            session.choose(ImportChoice.DETECT);
            assertTrue(session.busy());
            assertFalse(session.fresh());
            session.stop();
            assertTrue(session.stopped());
            assertTrue(session.found().isEmpty());
            held.countDown();
            runOne();
            assertTrue(session.found().isEmpty(), "what was given up is not shown");
            session.choose(session.choice());
            runOne();
            assertTrue(session.fresh());
            assertEquals(4, session.found().orElseThrow().curves().get(0).points().size());
        }
    }

    @Test
    void theNewestChoiceCounts() throws InterruptedException {
        try (ImportSession session = new ImportSession("slow", this::slow, ui::add)) {
            session.choose(ImportChoice.DETECT);
            ImportChoice other = ImportChoice.DETECT.withDecimalSign(Optional.of(DecimalSign.COMMA));
            session.choose(other);
            held.countDown();
            runOne();
            runOne();
            assertEquals(other, session.found().orElseThrow().choice());
            assertEquals(1.5, session.found().orElseThrow().curves().get(0).points().shearRate(0), 0);
        }
    }

    @Test
    void whatCannotBeReadIsAProblemAndNoDefect() throws InterruptedException {
        try (ImportSession session = new ImportSession("gone.csv", () -> CurveSource.file(Path.of("no such folder", "gone.csv")), ui::add)) {
            session.choose(ImportChoice.DETECT);
            runOne();
            assertTrue(session.reading().orElseThrow().problem().contains("gone.csv"));
            assertEquals(null, session.defect());
        }
    }
}
