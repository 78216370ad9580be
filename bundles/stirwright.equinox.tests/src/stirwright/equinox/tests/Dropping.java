package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.util.HexFormat;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.io.TempDir;
import org.osgi.framework.Bundle;
import org.osgi.framework.ServiceReference;
import stirwright.trust.DropIn;
import stirwright.trust.DropIn.State;
import stirwright.trust.DropIns;

/** A folder that the real watcher looks into, and a user's lists of its own for each test. */
abstract class Dropping {
    static final String NAME = "dropped.tattler";

    @TempDir
    Path temporary;

    Path families;
    Path settings;

    @BeforeEach
    void watch() throws Exception {
        families = Files.createDirectory(temporary.resolve("families"));
        settings = temporary.resolve("settings");
        System.setProperty("stirwright.families", families.toString());
        System.setProperty("stirwright.settings", settings.toString());
        Tattler.forget(NAME);
        restart();
    }

    @AfterEach
    void leave() throws Exception {
        try (Stream<Path> files = Files.list(families)) {
            for (Path file : files.toList()) {
                Files.delete(file);
            }
        }
        restart();
        watcher().stop();
        System.clearProperty("stirwright.families");
        System.clearProperty("stirwright.settings");
        assertTrue(Framework.bundle(NAME).isEmpty(), "a dropped bundle stays");
    }

    static Bundle watcher() {
        return Framework.installed("stirwright.trust");
    }

    /** As at the start of another run. */
    static void restart() throws Exception {
        watcher().stop();
        watcher().start();
        assertTrue(Framework.becomes(() -> reference() != null), "the service has not come");
    }

    private static ServiceReference<DropIns> reference() {
        return Framework.context().getServiceReference(DropIns.class);
    }

    static DropIns dropIns() {
        return Framework.context().getService(reference());
    }

    Path drop(String file, TinyBundle bundle) throws IOException {
        return drop(file, bundle.jar());
    }

    Path drop(String file, byte[] content) throws IOException {
        return Files.write(families.resolve(file), content);
    }

    static String sha256(Path file) throws Exception {
        return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(Files.readAllBytes(file)));
    }

    static Optional<DropIn> found(Path file) {
        return dropIns().list().stream().filter(dropIn -> dropIn.file().equals(file)).findFirst();
    }

    /** Waits until a file is listed in a state and gives what is listed. */
    static DropIn awaited(Path file, State state) throws InterruptedException {
        assertTrue(Framework.becomes(() -> found(file).filter(d -> d.state() == state).isPresent()),
                () -> state + " is awaited, there is " + dropIns().list());
        return found(file).orElseThrow();
    }

    static void becomesGone(Path file) throws InterruptedException {
        assertTrue(Framework.becomes(() -> found(file).isEmpty()), () -> "still listed: " + dropIns().list());
    }

    /** Drops a bundle and approves it as soon as it asks. */
    Path dropApproved(String file, TinyBundle bundle) throws Exception {
        return dropApproved(file, bundle.jar());
    }

    Path dropApproved(String file, byte[] content) throws Exception {
        Path jar = drop(file, content);
        awaited(jar, State.ASKS);
        dropIns().approve(sha256(jar));
        return jar;
    }
}
