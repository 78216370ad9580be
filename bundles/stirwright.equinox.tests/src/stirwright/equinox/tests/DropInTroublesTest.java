package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.osgi.framework.Bundle;
import stirwright.trust.DropIn;
import stirwright.trust.DropIn.State;

/** Jars that cannot run, and how they come to run later. */
class DropInTroublesTest extends Dropping {
    private static final String PACKAGE = "dropped.needed";

    private static TinyBundle needy() throws Exception {
        return Tattler.bundle(NAME, "1.0.0").header("Import-Package", PACKAGE + ",org.osgi.framework");
    }

    private static TinyBundle provider() {
        return TinyBundle.named("dropped.provider").header("Export-Package", PACKAGE);
    }

    @Test
    void aCorruptJarIsTold() throws Exception {
        Path jar = drop("a.jar", "no jar at all".getBytes());
        DropIn told = awaited(jar, State.UNUSABLE);
        assertEquals("is not a jar", told.message());
        assertEquals(sha256(jar), told.sha256());
        drop("a.jar", Tattler.bundle(NAME, "1.0.0"));
        awaited(jar, State.ASKS);
    }

    @Test
    void approvingWhatIsNoBundleRunsNothing() throws Exception {
        Path jar = drop("a.jar", Tattler.bundle(NAME, "1.0.0").header("Fragment-Host", "stirwright.core"));
        awaited(jar, State.UNUSABLE);
        dropIns().approve(sha256(jar));
        assertTrue(Framework.becomes(() -> !dropIns().approved().isEmpty()), "the list was not read");
        assertTrue(awaited(jar, State.UNUSABLE).message().contains("fragment of stirwright.core"));
        assertTrue(Framework.bundle(NAME).isEmpty());
    }

    @Test
    void whatIsMissingIsNamedAndArrivesInTheFolder() throws Exception {
        Path jar = dropApproved("a.jar", needy());
        String message = awaited(jar, State.UNUSABLE).message();
        assertTrue(message.contains("nothing that is installed provides") && message.contains(PACKAGE), message);
        Path needed = dropApproved("b.jar", provider());
        awaited(jar, State.RUNNING);
        assertEquals("1.0.0", Tattler.ran(NAME));
        Files.delete(needed);
        assertTrue(awaited(jar, State.UNUSABLE).message().contains(PACKAGE));
    }

    @Test
    void whatIsMissingArrivesFromElsewhere() throws Exception {
        Path jar = dropApproved("a.jar", needy());
        awaited(jar, State.UNUSABLE);
        Bundle provider = Framework.install("provider", provider().jar());
        try {
            awaited(jar, State.RUNNING);
        } finally {
            provider.uninstall();
        }
    }

    @Test
    void aStartThatFailsIsToldAndTriedAgain() throws Exception {
        Path jar = dropApproved("a.jar", TinyBundle.named(NAME).holding(JarCheckTest.Stubborn.class)
                .header("Bundle-Activator", JarCheckTest.Stubborn.class.getName()));
        String message = awaited(jar, State.UNUSABLE).message();
        assertTrue(message.contains("cannot be started") && message.contains("I will not"), message);
        drop("a.jar", Tattler.bundle(NAME, "2.0.0"));
        awaited(jar, State.ASKS);
        assertNull(Tattler.ran(NAME));
    }

    @Test
    void aFolderIsNoJar() throws Exception {
        Path folder = Files.createDirectory(families.resolve("a.jar"));
        assertEquals("is a folder, not a jar", awaited(folder, State.UNUSABLE).message());
    }
}
