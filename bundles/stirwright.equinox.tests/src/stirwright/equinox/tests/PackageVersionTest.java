package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.jar.Manifest;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** A package's version stands in its source and in the bundle's manifest; the two must agree. */
class PackageVersionTest {
    private static final String PACKAGE_INFO = "package-info.java";
    private static final Pattern EXPORTED = Pattern.compile("(?:^|,)\\s*([\\w.]+)(?:;version=\"([^\"]+)\")?");
    private static final Pattern ANNOTATED = Pattern.compile("(?m)^@Version\\(\"([^\"]+)\"\\)\\s*^package\\s+([\\w.]+);");

    static List<Path> bundles() throws IOException {
        return DependencyRuleTest.bundles();
    }

    @ParameterizedTest
    @MethodSource("bundles")
    void theManifestSaysWhatThePackageSays(Path bundle) throws IOException {
        assertEquals(annotated(bundle), exported(bundle), bundle.getFileName().toString());
    }

    @Test
    void thePackagesAreFound() throws IOException {
        Path contract = SourceTree.root().resolve("bundles/stirwright.correlation");
        assertEquals(List.of("stirwright.correlation"), List.copyOf(annotated(contract).keySet()));
        String version = exported(contract).get("stirwright.correlation");
        assertTrue(version.matches("1\\.\\d+\\.\\d+"), () -> "version " + version);
    }

    /** Version by package, of the packages that have one. */
    private static Map<String, String> annotated(Path bundle) throws IOException {
        try (Stream<Path> files = Files.walk(bundle.resolve("src"))) {
            Map<String, String> versions = new TreeMap<>();
            for (Path file : files.filter(f -> f.endsWith(PACKAGE_INFO)).toList()) {
                ANNOTATED.matcher(Files.readString(file)).results().forEach(m -> versions.put(m.group(2), m.group(1)));
            }
            return versions;
        }
    }

    private static Map<String, String> exported(Path bundle) throws IOException {
        try (InputStream in = Files.newInputStream(bundle.resolve("META-INF/MANIFEST.MF"))) {
            String header = new Manifest(in).getMainAttributes().getValue("Export-Package");
            return EXPORTED.matcher(Optional.ofNullable(header).orElse("")).results().collect(Collectors.toMap(m -> m.group(1),
                    m -> Optional.ofNullable(m.group(2)).orElse("none"), (first, again) -> first, TreeMap::new));
        }
    }
}
