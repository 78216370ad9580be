package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.osgi.framework.Bundle;
import stirwright.trust.DropIn;
import stirwright.trust.DropIn.State;

/** What runs of what is dropped: approved contents, and nothing else. */
class DropInsTest extends Dropping {

    @Test
    void anApprovedFamilyArrivesAndLeaves() throws Exception {
        byte[] content = TinyBundle.named("dropped.wanderer").component(Wanderer.class).jar();
        Path jar = dropApproved("wanderer.jar", content);
        assertTrue(Framework.becomes(() -> Framework.catalogue().family("wanderer").isPresent()), "it has not arrived");
        assertEquals(State.RUNNING, awaited(jar, State.RUNNING).state());
        Files.delete(jar);
        assertTrue(Framework.becomes(() -> Framework.catalogue().family("wanderer").isEmpty()), "it has not left");
        // The family goes first; the list follows when the look that turned it out is over.
        becomesGone(jar);
        assertTrue(Framework.bundle("dropped.wanderer").isEmpty());
        drop("again.jar", content);
        assertTrue(Framework.becomes(() -> Framework.catalogue().family("wanderer").isPresent()), "it is asked for twice");
    }

    @Test
    void anotherContentDoesNotRunAndAsks() throws Exception {
        List<Bundle> before = Arrays.asList(Framework.context().getBundles());
        Path jar = drop("a.jar", Tattler.bundle(NAME, "1.2.3"));
        assertEquals(new DropIn(jar, NAME, "1.2.3", sha256(jar), State.ASKS, ""), awaited(jar, State.ASKS));
        restart();
        Thread.sleep(1000);
        assertNull(Tattler.ran(NAME));
        assertEquals(before, Arrays.asList(Framework.context().getBundles()));
        Files.delete(jar);
        becomesGone(jar);
    }

    @Test
    void anApprovedOneRunsBeforeTheServiceIsThere() throws Exception {
        Path jar = dropApproved("a.jar", Tattler.bundle(NAME, "1.0.0"));
        awaited(jar, State.RUNNING);
        watcher().stop();
        Tattler.forget(NAME);
        watcher().start();
        assertEquals("1.0.0", Tattler.ran(NAME));
        assertEquals(State.RUNNING, found(jar).orElseThrow().state());
    }

    @Test
    void anApprovedFileThatIsOverwrittenStopsAndAsks() throws Exception {
        byte[] content = Tattler.bundle(NAME, "1.0.0").jar();
        Path jar = dropApproved("a.jar", content);
        awaited(jar, State.RUNNING);
        assertEquals("1.0.0", Tattler.ran(NAME));
        drop("a.jar", Tattler.bundle(NAME, "2.0.0").jar());
        assertEquals("2.0.0", awaited(jar, State.ASKS).version());
        assertTrue(Framework.bundle(NAME).isEmpty(), "the old content still runs");
        Thread.sleep(1000);
        assertEquals("1.0.0", Tattler.ran(NAME));
        Tattler.forget(NAME);
        drop("a.jar", content);
        awaited(jar, State.RUNNING);
        assertEquals("1.0.0", Tattler.ran(NAME), "the content that was approved runs again");
    }

    @Test
    void theSameNameAndVersionWithAnotherContentAsks() throws Exception {
        Path jar = dropApproved("a.jar", TinyBundle.named(NAME));
        awaited(jar, State.RUNNING);
        drop("a.jar", Tattler.bundle(NAME, "1.0.0"));
        awaited(jar, State.ASKS);
        assertNull(Tattler.ran(NAME));
    }

    @Test
    void nothingIsReplacedUnderTheNameOfABundleThatRuns() throws Exception {
        Bundle core = Framework.installed("stirwright.core");
        long modified = core.getLastModified();
        Path jar = dropApproved("a.jar", Tattler.bundle("stirwright.core", core.getVersion().toString()));
        String message = awaited(jar, State.UNUSABLE).message();
        assertTrue(message.contains("stirwright.core " + core.getVersion()) && message.contains("installed already"), message);
        assertNull(Tattler.ran("stirwright.core"));
        assertEquals(modified, core.getLastModified());
    }

    @Test
    void ofTwoOfOneNameTheSecondWaitsForTheFirstToLeave() throws Exception {
        byte[] content = Tattler.bundle(NAME, "1.0.0").jar();
        Path first = dropApproved("a.jar", content);
        awaited(first, State.RUNNING);
        Path second = drop("b.jar", content);
        assertTrue(awaited(second, State.UNUSABLE).message().endsWith("from a.jar"), () -> found(second).toString());
        Files.delete(first);
        awaited(second, State.RUNNING);
    }

    @Test
    void whatSaysItIsOneBundleAndIsAnotherDoesNotRun() throws Exception {
        byte[] shown = TinyBundle.named("dropped.harmless").jar();
        byte[] hidden = Tattler.bundle(NAME, "1.0.0").jar();
        byte[] both = Arrays.copyOf(shown, shown.length + hidden.length);
        System.arraycopy(hidden, 0, both, shown.length, hidden.length);
        Path jar = drop("a.jar", both);
        assertEquals("dropped.harmless", awaited(jar, State.ASKS).name());
        dropIns().approve(sha256(jar));
        String message = awaited(jar, State.UNUSABLE).message();
        assertTrue(message.contains("dropped.harmless") && message.contains(NAME), message);
        assertNull(Tattler.ran(NAME));
    }

    @Test
    void onceNobodyWatchesNothingRuns() throws Exception {
        Path jar = dropApproved("a.jar", Tattler.bundle(NAME, "1.0.0"));
        awaited(jar, State.RUNNING);
        watcher().stop();
        assertTrue(Framework.installed(NAME).getState() != Bundle.ACTIVE, "it runs unwatched");
        drop("a.jar", Tattler.bundle(NAME, "2.0.0"));
        Thread.sleep(1000);
        assertEquals("1.0.0", Tattler.ran(NAME));
        watcher().start();
        awaited(jar, State.ASKS);
        assertEquals("1.0.0", Tattler.ran(NAME));
    }

    @Test
    void nothingElseWatchesFolders() {
        // It would run whatever it finds, under the eyes of this one.
        assertTrue(Framework.bundle("org.apache.felix.fileinstall").isEmpty());
    }
}
