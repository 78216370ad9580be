package stirwright.product;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.Reader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Properties;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class ContentsTest {
    @TempDir
    private Path folder;

    @ParameterizedTest
    @EnumSource
    void hasWhatAUserLooksForAndNoOtherPlatformsStart(Platform platform) throws Exception {
        Path home = platform.unpack(folder);
        assertEquals(Platform.TOP, home.getFileName().toString());
        for (String name : List.of("LICENSE", "third-party.txt", "sdk/template/pom.xml", "sdk/stirwright.correlation.jar")) {
            assertTrue(Files.size(home.resolve(name)) > 100, name);
        }
        assertTrue(Files.readString(home.resolve("families/README.txt")).contains("stirwright trust"));
        try (Stream<Path> entries = Files.list(home)) {
            Set<String> starts = entries.map(file -> file.getFileName().toString())
                    .filter(name -> name.startsWith("stirwright")).collect(Collectors.toSet());
            assertEquals(Set.of(platform.startScript()), starts);
        }
        Path start = home.resolve(platform.startScript());
        if (platform == Platform.WINDOWS_X86_64) {
            String text = Files.readString(start);
            assertEquals(text.lines().count(), text.split("\r\n").length, "labels are missed at single line feeds");
        } else {
            assertTrue(Files.isExecutable(start));
        }
    }

    @ParameterizedTest
    @EnumSource
    void configurationNamesFilesThatAreThere(Platform platform) throws Exception {
        Path home = platform.unpack(folder);
        Path configuration = home.resolve("configuration");
        Properties config = new Properties();
        try (Reader reader = Files.newBufferedReader(configuration.resolve("config.ini"))) {
            config.load(reader);
        }
        assertTrue(Files.exists(home.resolve(config.getProperty("osgi.framework").replaceFirst("^file:", ""))));
        String first = config.getProperty("osgi.bundles").replaceFirst("^reference:file:([^@]*)@.*", "$1");
        assertTrue(Files.exists(home.resolve("plugins").resolve(first)), first);
        assertEquals("stirwright.console.application", config.getProperty("eclipse.application"));

        List<String> listed = bundles(home);
        assertFalse(listed.isEmpty());
        try (Stream<Path> jars = Files.list(home.resolve("plugins"))) {
            assertEquals(jars.map(jar -> "plugins/" + jar.getFileName()).collect(Collectors.toSet()), Set.copyOf(listed));
        }
    }

    @ParameterizedTest
    @EnumSource
    void nothingThatIsMadeForOneMachineIsShipped(Platform platform) throws Exception {
        Path home = platform.unpack(folder);
        assertFalse(Files.exists(home.resolve("p2")), "the installer's notes");
        boolean resolved = Files.exists(home.resolve("configuration/org.eclipse.osgi"));
        assertEquals(platform == Platform.LINUX_X86_64, resolved, "resolved for another platform");
    }

    /** The paths of the bundles that the configuration lists. */
    static List<String> bundles(Path home) throws IOException {
        Path list = home.resolve("configuration/org.eclipse.equinox.simpleconfigurator/bundles.info");
        return Files.readAllLines(list).stream().filter(line -> !line.startsWith("#")).map(line -> line.split(",")[2]).toList();
    }
}
