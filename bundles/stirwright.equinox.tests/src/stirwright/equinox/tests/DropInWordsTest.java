package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;
import stirwright.trust.DropIn.State;

/** The user's word: given here, taken back, and given by another process. */
class DropInWordsTest extends Dropping {

    @Test
    void whatIsDeclinedStaysQuietAndCanBeApprovedLater() throws Exception {
        Path jar = drop("a.jar", Tattler.bundle(NAME, "1.0.0"));
        awaited(jar, State.ASKS);
        dropIns().decline(sha256(jar));
        awaited(jar, State.DECLINED);
        restart();
        assertEquals(State.DECLINED, found(jar).orElseThrow().state(), "it asks again at the next start");
        assertNull(Tattler.ran(NAME));
        dropIns().approve(sha256(jar));
        awaited(jar, State.RUNNING);
        dropIns().decline(sha256(jar));
        awaited(jar, State.DECLINED);
        assertTrue(Framework.bundle(NAME).isEmpty(), "it runs though it is declined");
    }

    @Test
    void whatIsForgottenStopsAndAsks() throws Exception {
        Path jar = dropApproved("a.jar", Tattler.bundle(NAME, "1.0.0"));
        awaited(jar, State.RUNNING);
        assertTrue(dropIns().forget(sha256(jar)));
        awaited(jar, State.ASKS);
        assertTrue(Framework.bundle(NAME).isEmpty());
        assertFalse(dropIns().forget(sha256(jar)), "it is on no list any more");
    }

    @Test
    void aListThatAnotherProcessWritesCounts() throws Exception {
        Path jar = drop("a.jar", Tattler.bundle(NAME, "1.0.0"));
        awaited(jar, State.ASKS);
        Files.createDirectories(settings);
        Path list = Files.writeString(settings.resolve("approved.txt"), sha256(jar) + " " + NAME + " 2030-01-31\n");
        awaited(jar, State.RUNNING);
        Files.writeString(list, "# nothing any more\n");
        awaited(jar, State.ASKS);
        assertTrue(Framework.bundle(NAME).isEmpty());
        Files.delete(list);
        assertEquals(List.of(), dropIns().problems());
    }

    @Test
    void aDamagedLineIsToldAndApprovesNothing() throws Exception {
        Path jar = drop("a.jar", Tattler.bundle(NAME, "1.0.0"));
        awaited(jar, State.ASKS);
        Files.createDirectories(settings);
        Files.writeString(settings.resolve("approved.txt"), sha256(jar) + "\n");
        assertTrue(Framework.becomes(() -> !dropIns().problems().isEmpty()), "nothing is told");
        assertTrue(dropIns().problems().get(0).contains("approved.txt, line 1"), () -> dropIns().problems().toString());
        assertEquals(State.ASKS, found(jar).orElseThrow().state());
        assertNull(Tattler.ran(NAME));
    }

    @Test
    void listenersAreToldUntilTheyLeave() throws Exception {
        AtomicInteger calls = new AtomicInteger();
        AutoCloseable failing = dropIns().listen(() -> {
            throw new IllegalStateException("invented for a test");
        });
        AutoCloseable listening = dropIns().listen(calls::incrementAndGet);
        Path jar = drop("a.jar", Tattler.bundle(NAME, "1.0.0"));
        assertTrue(Framework.becomes(() -> calls.get() == 1), "nobody was told");
        assertEquals(State.ASKS, found(jar).orElseThrow().state());
        Thread.sleep(1000);
        assertEquals(1, calls.get(), "told though nothing changed");
        listening.close();
        failing.close();
        Files.delete(jar);
        becomesGone(jar);
        assertEquals(1, calls.get());
    }

    @Test
    void readingAJarElsewhereInstallsNothing() throws Exception {
        Path jar = Files.write(temporary.resolve("elsewhere.jar"), Tattler.bundle(NAME, "1.0.0").jar());
        assertEquals(NAME + " 1.0.0", dropIns().read(jar).bundle());
        assertEquals(State.ASKS, dropIns().read(jar).state());
        assertEquals(State.UNUSABLE, dropIns().read(temporary.resolve("missing.jar")).state());
        assertTrue(Framework.bundle(NAME).isEmpty());
        dropIns().approve(dropIns().read(jar));
        assertTrue(Framework.becomes(() -> dropIns().approved().stream().anyMatch(a -> a.bundle().equals(NAME + " 1.0.0"))));
        Path dropped = Files.copy(jar, families.resolve("a.jar"));
        awaited(dropped, State.RUNNING);
    }

    @Test
    void whatIsNoHashIsRefused() {
        assertThrows(IllegalArgumentException.class, () -> dropIns().approve("abc"));
        assertThrows(IllegalArgumentException.class, () -> dropIns().decline(""));
        assertThrows(IllegalArgumentException.class, () -> dropIns().forget("z".repeat(64)));
    }
}
