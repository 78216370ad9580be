package stirwright.product;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import com.sun.jna.platform.unix.X11.Window;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The archive of this platform, unpacked where nothing can be written, in a folder with a blank in its name. */
class StartTest {
    @TempDir
    private Path folder;

    private Path home;
    private Map<String, String> environment;
    private Map<Path, String> before;

    @BeforeEach
    void unpack() throws Exception {
        home = unpack(Platform.LINUX_X86_64, "read only");
        environment = new HashMap<>(Map.of("DISPLAY", "", "WAYLAND_DISPLAY", "", "JAVA_HOME", System.getProperty("java.home"),
                "XDG_CACHE_HOME", Files.createDirectories(folder.resolve("a cache")).toString()));
        before = state();
    }

    private Path unpack(Platform platform, String name) throws IOException, InterruptedException {
        Path unpacked = platform.unpack(folder.resolve(name));
        assertEquals(0, Run.of(folder, Map.of(), "chmod", "-R", "a-w", unpacked.toString()).exitCode());
        return unpacked;
    }

    /** Looked at, since rights alone do not keep the administrator from writing. */
    @AfterEach
    void theInstallationIsAsItWas() throws Exception {
        assertEquals(before, state());
        assertEquals(0, Run.of(folder, Map.of(), "chmod", "-R", "u+w", folder.toString()).exitCode());
    }

    private Map<Path, String> state() throws IOException {
        Map<Path, String> state = new TreeMap<>();
        try (Stream<Path> files = Files.walk(home)) {
            for (Path file : files.toList()) {
                state.put(file, Files.getLastModifiedTime(file) + " " + Files.size(file));
            }
        }
        return state;
    }

    private Run stirwright(String... arguments) throws IOException, InterruptedException {
        return Run.of(folder, environment, command(arguments));
    }

    private String[] command(String... arguments) {
        List<String> command = new ArrayList<>(List.of(home.resolve("stirwright").toString()));
        command.addAll(List.of(arguments));
        return command.toArray(String[]::new);
    }

    @Test
    void demoAndCandidatesRun() throws Exception {
        Run demo = stirwright("demo");
        assertEquals(0, demo.exitCode(), demo::err);
        assertTrue(demo.out().contains("invented"), demo::out);
        Run candidates = stirwright("candidates");
        assertEquals(0, candidates.exitCode(), candidates::err);
        assertTrue(candidates.out().contains("pitchedblade.np."), candidates::out);
    }

    @Test
    void argumentsArriveUnchanged() throws Exception {
        Run run = stirwright("crosscheck", "no  such 'file' $HOME *.csv");
        assertEquals(3, run.exitCode());
        assertTrue(run.err().contains("no  such 'file' $HOME *.csv"), run::err);
    }

    @Test
    void windowWithoutADisplayEndsInOneSentence() throws Exception {
        for (String[] arguments : new String[][] {{}, {"open"}, {"open", "mud.study"}, {"demo", "--window"}}) {
            Run run = stirwright(arguments);
            assertEquals(3, run.exitCode(), run::out);
            assertEquals("", run.out());
            assertEquals(1, run.err().lines().count(), run::err);
            assertTrue(run.err().contains("DISPLAY") && run.err().contains("stirwright help"), run::err);
        }
    }

    @Test
    void aPathThatCannotBeUsedIsToldInWords() throws Exception {
        for (String name : List.of("a:b", "a#b", "a?b", "a%41b")) {
            Path script = Files.copy(home.resolve("stirwright"), Files.createDirectory(folder.resolve(name)).resolve("stirwright"));
            Run run = Run.of(folder, environment, script.toString(), "--version");
            assertEquals(3, run.exitCode(), run::err);
            assertEquals(1, run.err().lines().count(), run::err);
            assertTrue(run.err().contains(script.getParent().toString()) && run.err().contains("move it"), run::err);
        }
    }

    @Test
    void whoHasNoHomeGetsOneFolderOfTheirOwn() throws Exception {
        Path temporary = Files.createDirectory(folder.resolve("temporary"));
        environment.putAll(Map.of("HOME", "", "XDG_CACHE_HOME", "", "TMPDIR", temporary.toString()));
        for (int i = 0; i < 2; i++) {
            assertEquals(0, stirwright("--version").exitCode());
        }
        try (Stream<Path> files = Files.list(temporary)) {
            List<Path> made = files.toList();
            assertEquals(1, made.size(), made::toString);
            assertEquals("rwx------", PosixFilePermissions.toString(Files.getPosixFilePermissions(made.get(0))));
            Files.move(made.get(0), folder.resolve("moved"));
            Files.createSymbolicLink(made.get(0), folder.resolve("moved"));
        }
        Run run = stirwright("--version");
        assertEquals(0, run.exitCode(), run::err);
        try (Stream<Path> files = Files.list(temporary)) {
            assertEquals(2, files.count(), "a link in the place of the folder was followed");
        }
    }

    @Test
    void wrongUseOfOpenIsToldByTheCommandLine() throws Exception {
        Run run = stirwright("open", "one", "two");
        assertEquals(3, run.exitCode());
        assertTrue(run.err().contains("two") && run.err().contains("stirwright help open"), run::err);
    }

    @Test
    void windowComesUpAndClosesWithoutAWord() throws Exception {
        Optional<Screen> opened = Screen.open();
        assumeTrue(opened.isPresent(), "this machine has no Xvfb");
        try (Screen screen = opened.get()) {
            environment.put("DISPLAY", screen.name());
            try (Run.Started started = Run.start(folder, environment, command())) {
                Window window = screen.await("Stirwright", started.process());
                screen.close(window);
                assertEquals(new Run(0, "", ""), started.end());
            }
        }
    }

    /** The other platform's bundle for drawing does not resolve here, but commands need none: it is an engine alone. */
    @Test
    void engineAloneRunsCommandsAndSaysThatItHasNoWindow() throws Exception {
        home = unpack(Platform.LINUX_AARCH64, "engine alone");
        Path list = home.resolve("configuration/org.eclipse.equinox.simpleconfigurator/bundles.info");
        assertEquals(0, Run.of(folder, Map.of(), "sed", "-i", "/^stirwright.workbench,/d", list.toString()).exitCode());
        before = state();
        Run demo = stirwright("demo");
        assertEquals(0, demo.exitCode(), demo::err);
        environment.put("DISPLAY", ":99999");
        Run window = stirwright();
        assertEquals(3, window.exitCode(), window::out);
        assertEquals(1, window.err().lines().count(), window::err);
        assertTrue(window.err().contains("no window") && window.err().contains("stirwright help"), window::err);
    }
}
