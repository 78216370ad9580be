package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.jar.Attributes;
import java.util.jar.Manifest;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Who may use whom, read from the manifests. */
class DependencyRuleTest {
    private static final String OURS = "stirwright.";
    private static final Pattern WINDOW = Pattern.compile("org\\.eclipse\\.(swt|jface|e4|swtchart|nebula)(\\..*)?");
    private static final Set<String> MAY_USE_A_WINDOW = Set.of("chart", "workbench");

    /** What each bundle may use of ours; {@code family} stands for every family. */
    private static final Map<String, Set<String>> MAY_USE = Map.ofEntries(
            Map.entry("correlation", Set.of()),
            Map.entry("rheology", Set.of()),
            Map.entry("start", Set.of()),
            Map.entry("trust", Set.of()),
            Map.entry("chart", Set.of()),
            Map.entry("study", Set.of()),
            Map.entry("family", Set.of("correlation")),
            Map.entry("general", Set.of("correlation")),
            Map.entry("sheet", Set.of("correlation")),
            Map.entry("core", Set.of("correlation", "rheology")),
            Map.entry("conformance", Set.of("correlation", "core")),
            Map.entry("cards", Set.of("correlation", "core", "conformance")),
            Map.entry("exchange", Set.of("correlation", "rheology", "core", "study")),
            Map.entry("console", Set.of("correlation", "rheology", "core", "study", "exchange", "conformance", "cards", "trust")),
            Map.entry("workbench", Set.of("correlation", "rheology", "core", "study", "exchange", "conformance", "cards", "trust",
                    "chart")));

    private static final Set<String> EXPORT_NOTHING = Set.of("family", "general", "sheet", "start");

    static List<Path> bundles() throws IOException {
        return SourceTree.folders("bundles").stream()
                .filter(folder -> Files.exists(folder.resolve("META-INF/MANIFEST.MF")))
                .filter(folder -> !folder.getFileName().toString().endsWith(".tests")).toList();
    }

    @Test
    void theManifestsAreFound() throws IOException {
        List<String> names = bundles().stream().map(DependencyRuleTest::word).toList();
        assertTrue(names.containsAll(List.of("correlation", "rheology", "core", "family", "general", "conformance",
                "exchange", "console")), () -> "found only " + names);
    }

    @ParameterizedTest
    @MethodSource("bundles")
    void usesOnlyWhatTheRuleAllows(Path bundle) throws IOException {
        Set<String> allowed = Optional.ofNullable(MAY_USE.get(word(bundle))).orElseThrow(
                () -> new AssertionError("the dependency rule does not speak of " + bundle.getFileName()));
        List<String> used = used(bundle).stream().filter(name -> name.startsWith(OURS)).map(DependencyRuleTest::word)
                .filter(word -> !word.equals(word(bundle)) && !allowed.contains(word)).toList();
        assertEquals(List.of(), used, bundle.getFileName() + " may use " + allowed + " of ours");
    }

    @ParameterizedTest
    @MethodSource("bundles")
    void leavesWindowsToTheWindow(Path bundle) throws IOException {
        if (!MAY_USE_A_WINDOW.contains(word(bundle))) {
            assertEquals(List.of(), used(bundle).stream().filter(name -> WINDOW.matcher(name).matches()).toList());
        }
    }

    @ParameterizedTest
    @MethodSource("bundles")
    void exportsNothingInternal(Path bundle) throws IOException {
        List<String> exported = names(headers(bundle), "Export-Package");
        assertEquals(List.of(), exported.stream().filter(name -> name.contains(".internal")).toList());
        if (EXPORT_NOTHING.contains(word(bundle))) {
            assertEquals(List.of(), exported, bundle.getFileName() + " is found at run time and exports nothing");
        }
    }

    @Test
    void theContractNeedsNothingButTheJdk() throws IOException {
        Path contract = SourceTree.root().resolve("bundles/stirwright.correlation");
        assertEquals(List.of(), used(contract).stream().filter(name -> !name.startsWith("org.osgi.annotation")).toList());
    }

    /** The packages and bundles that a bundle asks for. */
    private static List<String> used(Path bundle) throws IOException {
        Attributes headers = headers(bundle);
        List<String> used = new ArrayList<>(names(headers, "Import-Package"));
        used.addAll(names(headers, "Require-Bundle"));
        used.addAll(names(headers, "DynamicImport-Package"));
        return used;
    }

    private static List<String> names(Attributes headers, String header) {
        String value = Optional.ofNullable(headers.getValue(header)).orElse("").replaceAll("\"[^\"]*\"", "");
        return Stream.of(value.split(",")).map(clause -> clause.split(";")[0].strip())
                .filter(name -> !name.isEmpty()).toList();
    }

    private static Attributes headers(Path bundle) throws IOException {
        try (InputStream in = Files.newInputStream(bundle.resolve("META-INF/MANIFEST.MF"))) {
            return new Manifest(in).getMainAttributes();
        }
    }

    private static String word(Path bundle) {
        return word(bundle.getFileName().toString());
    }

    /** The word after the prefix, for instance "core" for stirwright.core.internal. */
    private static String word(String name) {
        return name.substring(OURS.length()).split("\\.")[0];
    }
}
