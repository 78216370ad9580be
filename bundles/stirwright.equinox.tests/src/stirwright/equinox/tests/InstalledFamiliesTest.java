package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.osgi.framework.Bundle;
import stirwright.conformance.InstalledBundles;
import stirwright.conformance.Subject;

/** A family in the source tree that no feature installs would be green and missing. */
class InstalledFamiliesTest {
    private static final Pattern PLUGIN = Pattern.compile("<plugin\\s[^>]*id=\"([^\"]+)\"");

    static List<String> families() throws IOException {
        List<String> names = new ArrayList<>(SourceTree.folders("bundles").stream().map(f -> f.getFileName().toString())
                .filter(name -> name.startsWith("stirwright.family.") && !name.endsWith(".tests")).toList());
        assertTrue(names.size() >= 2, () -> "only these family folders were found: " + names);
        names.add("stirwright.general");
        return names;
    }

    @ParameterizedTest
    @MethodSource("families")
    void isInstalledByAFeature(String name) throws IOException {
        Set<String> plugins = plugins();
        assertTrue(plugins.contains(name), () -> "no feature lists " + name + "; they list " + plugins);
    }

    @ParameterizedTest
    @MethodSource("families")
    void isActiveAndContributes(String name) {
        Bundle bundle = Framework.installed(name);
        List<Subject> subjects = InstalledBundles.subjects(Framework.context());
        assertTrue(bundle.getState() == Bundle.ACTIVE || bundle.getState() == Bundle.STARTING,
                () -> name + " is in state " + bundle.getState());
        assertTrue(subjects.stream().anyMatch(s -> s.origin().startsWith(name + " ") && !s.correlations().isEmpty()),
                () -> name + " contributes nothing; these do: " + subjects);
    }

    private static Set<String> plugins() throws IOException {
        List<String> features = new ArrayList<>();
        for (Path folder : SourceTree.folders("features")) {
            features.add(Files.readString(folder.resolve("feature.xml")));
        }
        return features.stream().flatMap(xml -> PLUGIN.matcher(xml).results()).map((MatchResult m) -> m.group(1))
                .collect(Collectors.toSet());
    }
}
