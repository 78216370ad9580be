package stirwright.exchange;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.StringWriter;
import java.lang.management.ManagementFactory;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import stirwright.core.CaseResult;
import stirwright.core.Status;

/** Ten thousand cases in one file: every one comes out, soon and without heaps of garbage. */
class ManyCasesTest {
    private static final int CASES = 10_000;

    /** Reading, computing and writing one case; several times what it takes, so that only a change of order fails. */
    private static final long MOST_BYTES_PER_CASE = 100_000;

    @TempDir
    Path folder;

    @Test
    @Timeout(20)
    void tenThousandCases() {
        StringBuilder text = new StringBuilder(Sheet.good().header() + "\n");
        for (int i = 0; i < CASES; i++) {
            text.append(Sheet.good().with("case", "case " + i).row()).append('\n');
        }
        Path file = Sheet.file(folder, text.toString().getBytes(UTF_8));
        long before = allocated();
        StringWriter out = new StringWriter();
        int computed = 0;
        CaseTable table = CaseTable.read(file, Invented.CATALOGUE);
        try (Output<CaseResult> results = ResultTable.to(out)) {
            for (CaseEntry entry : table.entries()) {
                CaseResult result = entry.check(Invented.CROSS_CHECK);
                computed += result.status() == Status.REFUSED ? 0 : 1;
                results.add(result);
            }
            results.finish();
        }
        long perCase = (allocated() - before) / CASES;
        assertEquals(CASES, computed);
        assertEquals(1 + 2 * CASES, out.toString().lines().count());
        assertTrue(perCase < MOST_BYTES_PER_CASE, () -> perCase + " bytes per case");
    }

    private static long allocated() {
        return ((com.sun.management.ThreadMXBean) ManagementFactory.getThreadMXBean())
                .getThreadAllocatedBytes(Thread.currentThread().threadId());
    }
}
