package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import stirwright.core.Catalogue;
import stirwright.core.CrossCheck;
import stirwright.core.Status;
import stirwright.exchange.CaseTable;
import stirwright.exchange.Demo;

/** A study is read and computed inside a framework, where its model's library comes from bundles of its own. */
class StudyTest {
    @TempDir
    Path folder;

    @Test
    void theDemoStudyIsComputed() {
        Catalogue catalogue = Framework.catalogue();
        CrossCheck crossCheck = new CrossCheck(catalogue);
        CaseTable table = CaseTable.read(Demo.copyTo(folder), catalogue);
        assertEquals(List.of("dipping", "after-weekend", "hold-disc", "hold-pitched", "rinse-water"),
                table.entries().stream().map(e -> e.name()).toList());
        assertTrue(table.entries().stream().noneMatch(e -> e.check(crossCheck).status() == Status.REFUSED));
    }
}
