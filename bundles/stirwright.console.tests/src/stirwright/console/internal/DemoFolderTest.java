package stirwright.console.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A folder whose name everybody can guess is used only when it is the user's own. */
class DemoFolderTest {
    @TempDir
    private Path temporary;

    private Path make() throws IOException {
        Path made = new DemoFolder(temporary, "somebody").make();
        assertTrue(Files.isDirectory(made, LinkOption.NOFOLLOW_LINKS));
        assertEquals("rwx------", PosixFilePermissions.toString(Files.getPosixFilePermissions(made)));
        return made;
    }

    @Test
    void itIsTheSameAtEveryRun() throws IOException {
        Path made = make();
        assertEquals(temporary.resolve("stirwright-demo-somebody"), made);
        assertEquals(made, make());
        try (var files = Files.list(temporary)) {
            assertEquals(1, files.count(), "nothing is left beside it");
        }
    }

    @Test
    void aPlantedLinkIsNotFollowed() throws IOException {
        Path bait = Files.createDirectory(temporary.resolve("bait"));
        Path link = Files.createSymbolicLink(temporary.resolve("stirwright-demo-somebody"), bait);
        Path made = make();
        assertNotEquals(link, made);
        assertFalse(Files.isSameFile(bait, made));
    }

    @Test
    void aFolderThatOthersCanWriteToIsNotUsed() throws IOException {
        Path open = Files.createDirectory(temporary.resolve("stirwright-demo-somebody"));
        Files.setPosixFilePermissions(open, PosixFilePermissions.fromString("rwxrwxrwx"));
        assertNotEquals(open, make());
    }
}
