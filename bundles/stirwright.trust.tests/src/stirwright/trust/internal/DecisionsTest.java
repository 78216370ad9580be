package stirwright.trust.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The two lists on disk. */
class DecisionsTest {
    private static final String HASH = "0123456789abcdef".repeat(4);
    private static final String OTHER = "fedcba9876543210".repeat(4);

    @TempDir
    private Path temporary;

    private Path folder;
    private Decisions decisions;

    @BeforeEach
    void start() {
        folder = temporary.resolve("deep/settings");
        decisions = new Decisions(folder);
        decisions.refresh();
    }

    @Test
    void nothingIsApprovedOrWrittenAtFirst() {
        assertFalse(decisions.approves(HASH));
        assertFalse(decisions.declines(HASH));
        assertEquals(List.of(), decisions.problems());
        assertFalse(decisions.forget(HASH));
        assertFalse(Files.exists(folder), "asking leaves nothing behind");
    }

    @Test
    void anApprovalIsReadByOthersAndOnlyOnce() {
        Decisions others = new Decisions(folder);
        others.refresh();
        decisions.approve(HASH, "a 1.0.0");
        assertFalse(others.approves(HASH), "before it was read");
        assertTrue(others.refresh());
        assertTrue(others.approves(HASH));
        assertFalse(others.approves(OTHER));
        assertEquals("a 1.0.0", others.approved().get(0).bundle());
        assertFalse(others.refresh(), "an unchanged file is not read again");
    }

    @Test
    void approvingTwiceWritesOneLine() {
        decisions.approve(HASH, "a");
        decisions.approve(HASH, "a");
        decisions.refresh();
        assertEquals(1, decisions.approved().size());
    }

    @Test
    void theLastWordCounts() {
        decisions.decline(HASH, "a");
        decisions.refresh();
        assertTrue(decisions.declines(HASH));
        decisions.approve(HASH, "a");
        decisions.refresh();
        assertTrue(decisions.approves(HASH) && !decisions.declines(HASH));
        decisions.decline(HASH, "a");
        decisions.refresh();
        assertTrue(!decisions.approves(HASH) && decisions.declines(HASH));
        assertTrue(decisions.forget(HASH));
        decisions.refresh();
        assertFalse(decisions.approves(HASH) || decisions.declines(HASH));
    }

    @Test
    void damagedLinesAreToldByFileAndNumber() throws IOException {
        Files.createDirectories(folder);
        Files.writeString(folder.resolve("approved.txt"), "# mine\n" + HASH.substring(1) + " a 2030-01-31\n");
        decisions.refresh();
        assertEquals(1, decisions.problems().size());
        assertTrue(decisions.problems().get(0).contains("approved.txt, line 2"), decisions.problems().get(0));
    }

    @Test
    void aListThatCannotBeReadApprovesNothingAndIsTold() throws IOException {
        decisions.approve(HASH, "a");
        decisions.refresh();
        Files.delete(folder.resolve("approved.txt"));
        Files.createDirectory(folder.resolve("approved.txt"));
        decisions.refresh();
        assertFalse(decisions.approves(HASH));
        assertTrue(decisions.problems().get(0).contains("approved.txt: cannot be read"), decisions.problems().toString());
    }

    /** A link to itself looks like no file, and cannot be read. */
    @Test
    void whatCouldNotBeReadIsTriedAgainAtTheNextLook() throws IOException {
        Files.createDirectories(folder);
        Path list = Files.createSymbolicLink(folder.resolve("approved.txt"), folder.resolve("approved.txt"));
        decisions = new Decisions(folder);
        assertTrue(decisions.refresh());
        assertEquals(1, decisions.problems().size());
        assertFalse(decisions.refresh(), "nothing new");
        Files.delete(list);
        assertTrue(decisions.refresh());
        assertEquals(List.of(), decisions.problems());
    }

    @Test
    void aFolderThatCannotBeWrittenIsTold() throws IOException {
        folder = temporary.resolve("deep");
        decisions = new Decisions(folder);
        Files.writeString(folder, "a file where the folder should be");
        UncheckedIOException failure = assertThrows(UncheckedIOException.class, () -> decisions.approve(HASH, "a"));
        assertTrue(failure.getMessage().contains("approved.txt cannot be written"), failure.getMessage());
        assertTrue(failure.getMessage().endsWith("deep is a file where a folder belongs"), failure.getMessage());
    }

    @Test
    void writingLeavesNoPartsBehindAndKeepsALink() throws IOException {
        Path kept = Files.writeString(temporary.resolve("kept.txt"), "# mine\n");
        Files.createDirectories(folder);
        Files.createSymbolicLink(folder.resolve("approved.txt"), kept);
        decisions.approve(HASH, "a");
        assertTrue(Files.isSymbolicLink(folder.resolve("approved.txt")));
        assertTrue(Files.readString(kept).startsWith("# mine\n" + HASH), Files.readString(kept));
        try (Stream<Path> files = Files.walk(temporary)) {
            assertEquals(List.of(), files.filter(f -> f.toString().endsWith(".new")).toList());
        }
    }
}
