package stirwright.product;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.function.Function;
import java.util.jar.Attributes;
import java.util.jar.JarFile;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.osgi.framework.Version;

/** The notice has one line for each bundle of others that any archive ships, and none for another. */
class ThirdPartyTest {
    /** bundle, group:artifact:version, licence; at least two blanks between. */
    private static final Pattern LINE = Pattern.compile("(\\S+) +(\\S+:\\S+):(\\d\\S*) +(\\S.*)");
    /** What a jar's own Bundle-License may say of each licence. */
    private static final Map<String, Pattern> OWN_WORDS = Map.of(
            "Apache-2.0", Pattern.compile("(?i).*apache.*2\\.0.*"), "EPL-2.0", Pattern.compile("(?i).*epl[- ]v?2\\.0.*"),
            "MIT", Pattern.compile("MIT.*"), "BSD", Pattern.compile("BSD.*"));

    /** Where jars have the text. */
    private static final Pattern TEXT = Pattern.compile("((META-INF|license)/)?LICENSE(\\.txt|\\.md)?");
    /** What either kind of licence says of passing the work on. */
    private static final Pattern LICENCE = Pattern.compile("Redistributions in binary form|4\\. Redistribution");

    private record Line(String artifact, String version, String licence) {}

    @TempDir
    private Path folder;

    @Test
    void noticeListsWhatShipsAndAgreesWithTheJars() throws Exception {
        Map<String, Attributes> shipped = new TreeMap<>();
        Set<String> notices = new TreeSet<>();
        for (Platform platform : Platform.values()) {
            Path home = platform.unpack(folder.resolve(platform.name()));
            notices.add(Files.readString(home.resolve("third-party.txt")));
            for (String path : ContentsTest.bundles(home)) {
                Attributes manifest = manifest(home.resolve(path));
                String name = manifest.getValue("Bundle-SymbolicName").replaceFirst(";.*", "").strip();
                if (!name.startsWith("stirwright.")) {
                    shipped.put(name, manifest);
                }
            }
        }
        assertEquals(1, notices.size(), "the same notice in every archive");
        Map<String, Line> lines = notices.iterator().next().lines().map(LINE::matcher).filter(match -> match.matches())
                .collect(Collectors.toMap(match -> match.group(1),
                        match -> new Line(match.group(2), match.group(3), match.group(4)), (a, b) -> {
                            throw new IllegalStateException("two lines: " + a + " and " + b);
                        }, TreeMap::new));

        assertEquals(shipped.keySet(), lines.keySet(),
                "rootfiles/all/third-party.txt: read the licence in the artifact's POM and its parents");
        lines.forEach((name, line) -> agrees(name, line, shipped.get(name)));
    }

    private static void agrees(String name, Line line, Attributes manifest) {
        Version version = Version.parseVersion(manifest.getValue("Bundle-Version"));
        Function<Version, String> numbers = v -> v.getMajor() + "." + v.getMinor() + "." + v.getMicro();
        assertEquals(numbers.apply(version), numbers.apply(Version.parseVersion(line.version())),
                () -> name + ": read the licence of the new version and write that version");
        String own = manifest.getValue("Bundle-License");
        if (own != null && !own.equals("LICENSE")) {
            assertTrue(OWN_WORDS.entrySet().stream()
                    .anyMatch(entry -> line.licence().contains(entry.getKey()) && entry.getValue().matcher(own).matches()),
                    () -> name + ": the notice says " + line.licence() + ", the jar " + own);
        }
    }

    /** Licences other than that of Stirwright itself want their text and notice to travel with the bundle. */
    @Test
    void everyOtherLicenceHasItsTextInTheJarOrBesideTheNotice() throws Exception {
        for (Platform platform : Platform.values()) {
            Path home = platform.unpack(folder.resolve(platform.name()));
            for (Matcher line : Files.readString(home.resolve("third-party.txt")).lines().map(LINE::matcher).toList()) {
                if (line.matches() && !line.group(4).contains("EPL-2.0")) {
                    for (Path jar : jars(home, line.group(1))) {
                        Path text = home.resolve("licences").resolve(line.group(1) + ".txt");
                        assertTrue(hasText(jar) || Files.exists(text) && LICENCE.matcher(Files.readString(text)).find(),
                                () -> jar + " has no licence text in it, nor at " + text);
                    }
                }
            }
        }
    }

    private static List<Path> jars(Path home, String bundle) throws IOException {
        return ContentsTest.bundles(home).stream().map(home::resolve)
                .filter(jar -> jar.getFileName().toString().startsWith(bundle + "_")).toList();
    }

    private static boolean hasText(Path jar) throws IOException {
        try (JarFile file = new JarFile(jar.toFile())) {
            return file.stream().anyMatch(entry -> entry.getSize() > 500 && TEXT.matcher(entry.getName()).matches());
        }
    }

    private static Attributes manifest(Path jar) throws IOException {
        try (JarFile file = new JarFile(jar.toFile())) {
            return file.getManifest().getMainAttributes();
        }
    }
}
