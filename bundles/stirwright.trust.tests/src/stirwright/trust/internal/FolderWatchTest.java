package stirwright.trust.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Set;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** When a file counts as being there. */
class FolderWatchTest {
    @TempDir
    private Path folder;

    private FolderWatch watch;
    private Path jar;

    @BeforeEach
    void start() {
        watch = new FolderWatch(folder);
        jar = folder.resolve("a.JAR");
    }

    @Test
    void aFileCountsOnceItIsAtRest() throws IOException {
        Files.writeString(jar, "1");
        assertEquals(Set.of(), watch.look(false).keySet());
        Files.writeString(jar, "12");
        assertEquals(Set.of(), watch.look(false).keySet(), "it has grown");
        assertEquals(Set.of(jar), watch.look(false).keySet());
    }

    @Test
    void theFirstLookTakesItAsItIs() throws IOException {
        Files.writeString(jar, "1");
        assertEquals(Set.of(jar), watch.look(true).keySet());
    }

    @Test
    void aFileThatIsWrittenKeepsItsOldStampForAMoment() throws IOException {
        Files.writeString(jar, "1");
        Stamp old = watch.look(true).get(jar);
        Files.writeString(jar, "12");
        assertEquals(old, watch.look(false).get(jar));
        assertNotEquals(old, watch.look(false).get(jar));
    }

    @Test
    void aFileThatIsReplacedHasAnotherStampThoughSizeAndTimeAreTheSame() throws IOException {
        Files.writeString(jar, "1");
        Stamp old = watch.look(true).get(jar);
        Path other = Files.writeString(folder.resolve("other"), "2");
        Files.setLastModifiedTime(other, old.modified());
        Files.move(other, jar, StandardCopyOption.REPLACE_EXISTING);
        assertNotEquals(old, watch.look(true).get(jar));
    }

    @Test
    void aFileThatIsGoneIsGoneAtOnce() throws IOException {
        Files.writeString(jar, "1");
        watch.look(true);
        Files.delete(jar);
        assertEquals(Set.of(), watch.look(false).keySet());
    }

    @Test
    void onlyJarsOfTheFolderItselfCount() throws IOException {
        Files.writeString(folder.resolve("README.txt"), "1");
        Files.writeString(folder.resolve("a.zip"), "1");
        Files.writeString(Files.createDirectory(folder.resolve("deep")).resolve("b.jar"), "1");
        assertEquals(Set.of(), watch.look(true).keySet());
    }

    @Test
    void aFolderThatIsNotThereIsEmpty() {
        FolderWatch nowhere = new FolderWatch(folder.resolve("nowhere"));
        assertEquals(Set.of(), nowhere.look(true).keySet());
        assertEquals("", nowhere.problem());
    }
}
