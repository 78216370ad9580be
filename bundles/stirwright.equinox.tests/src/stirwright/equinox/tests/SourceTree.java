package stirwright.equinox.tests;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/** The checkout that these tests were built from. */
final class SourceTree {

    private SourceTree() {}

    /** The nearest folder upwards of the working directory that holds the bundles. */
    static Path root() {
        return Stream.iterate(Path.of("").toAbsolutePath(), folder -> folder != null, Path::getParent)
                .filter(folder -> Files.isDirectory(folder.resolve("bundles/stirwright.correlation")))
                .findFirst().orElseThrow(() -> new AssertionError("not within a checkout: " + Path.of("").toAbsolutePath()));
    }

    /** The folders of a folder, by name. */
    static List<Path> folders(String name) throws IOException {
        try (Stream<Path> children = Files.list(root().resolve(name))) {
            return children.filter(Files::isDirectory).sorted().toList();
        }
    }
}
