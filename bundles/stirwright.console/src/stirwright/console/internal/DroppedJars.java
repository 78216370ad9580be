package stirwright.console.internal;

import java.io.IOException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.osgi.framework.Bundle;

/** Jars in the drop-in folder that did not become a running bundle: their installer skips them silently. */
final class DroppedJars {

    private DroppedJars() {}

    /**
     * @param folder the drop-in folder; null when there is none
     * @return one sentence for each jar that is of no use
     */
    static List<String> unusable(Bundle[] installed, String folder) {
        List<String> problems = new ArrayList<>();
        if (folder == null || !Files.isDirectory(Path.of(folder))) {
            return problems;
        }
        try (DirectoryStream<Path> jars = Files.newDirectoryStream(Path.of(folder), "*.jar")) {
            for (Path jar : jars) {
                problem(installed, jar).ifPresent(p -> problems.add(jar + ": " + p));
            }
        } catch (IOException unreadable) {
            problems.add(folder + ": cannot be read: " + unreadable.getMessage());
        }
        return problems;
    }

    private static Optional<String> problem(Bundle[] installed, Path jar) {
        // The installer writes file:/x, this platform's paths file:///x.
        String location = jar.toAbsolutePath().toFile().toURI().toString();
        Optional<Bundle> bundle = Arrays.stream(installed).filter(b -> b.getLocation().equals(location)).findFirst();
        if (bundle.isEmpty()) {
            return Optional.of("is not a bundle, or its name is installed already; 'stirwright check' says more");
        }
        boolean running = bundle.get().getState() == Bundle.ACTIVE || bundle.get().getState() == Bundle.STARTING;
        return running ? Optional.empty()
                : Optional.of("cannot be started, something that it needs is missing; 'stirwright check' says what");
    }
}
