package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.junit.jupiter.api.Test;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleActivator;
import org.osgi.framework.BundleContext;
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

    /** Who reads entry by entry sees one manifest, who looks it up by its name the other. */
    @Test
    void aSecondManifestMakesNoFragment() throws Exception {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ZipOutputStream out = new ZipOutputStream(bytes)) {
            for (String[] file : new String[][] {{"meta-inf/manifest.mf", ""}, {"META-INF/MANIFEST.MF", "Fragment-Host: stirwright.core\n"}}) {
                out.putNextEntry(new ZipEntry(file[0]));
                out.write(("Manifest-Version: 1.0\nBundle-ManifestVersion: 2\nBundle-SymbolicName: " + NAME
                        + "\nBundle-Version: 1.0.0\n" + file[1]).getBytes(StandardCharsets.UTF_8));
            }
        }
        Path jar = dropApproved("a.jar", bytes.toByteArray());
        String message = awaited(jar, State.UNUSABLE).message();
        assertTrue(message.contains("fragment by one of its manifests"), message);
        assertTrue(Framework.bundle(NAME).isEmpty());
    }

    @Test
    void aStartThatHangsKeepsNobodyWaiting() throws Exception {
        watcher().stop();
        Path jar = drop("a.jar", TinyBundle.named(NAME).holding(Sleeper.class)
                .header("Bundle-Activator", Sleeper.class.getName()));
        Files.createDirectories(settings);
        Files.writeString(settings.resolve("approved.txt"), sha256(jar) + " " + NAME + " 2030-01-31\n");
        try {
            watcher().start();
            String message = awaited(jar, State.UNUSABLE).message();
            assertTrue(message.contains("end of its start within 5 s"), message);
            Path other = dropApproved("b.jar", Tattler.bundle(NAME, "2.0.0"));
            awaited(other, State.RUNNING);
        } finally {
            Sleeper.wake();
        }
        awaited(jar, State.RUNNING);
    }

    /** Starts only when it is woken. */
    public static final class Sleeper implements BundleActivator {
        @Override
        public void start(BundleContext context) throws InterruptedException {
            while (System.getProperty("dropped.sleeper") == null) {
                Thread.sleep(20);
            }
        }

        static void wake() {
            System.setProperty("dropped.sleeper", "awake");
        }

        @Override
        public void stop(BundleContext context) {
            // Holds nothing.
        }
    }

    @Test
    void aFolderIsNoJar() throws Exception {
        Path folder = Files.createDirectory(families.resolve("a.jar"));
        assertEquals("is a folder, not a jar", awaited(folder, State.UNUSABLE).message());
    }
}
