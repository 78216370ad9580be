package stirwright.trust.internal;

import java.io.IOException;
import java.nio.file.DirectoryIteratorException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;

/** The jars in a folder, once they are no longer being written: a file counts when two looks find it the same. */
final class FolderWatch {
    private final Path folder;
    private final SortedMap<Path, Stamp> settled = new TreeMap<>();
    private Map<Path, Stamp> seen = Map.of();
    private String problem = "";

    FolderWatch(Path folder) {
        this.folder = folder;
    }

    /**
     * @param atOnce takes every file as it is
     * @return the files that are there, each with the stamp that it had when it last was at rest
     */
    SortedMap<Path, Stamp> look(boolean atOnce) {
        Map<Path, Stamp> now;
        try {
            now = jars();
            problem = "";
        } catch (IOException | DirectoryIteratorException unreadable) {
            // A drive that is away for a moment has not lost its files.
            problem = folder + ": cannot be read: " + unreadable.getMessage();
            return settled;
        }
        settled.keySet().retainAll(now.keySet());
        now.forEach((file, stamp) -> {
            if (atOnce || stamp.equals(seen.get(file))) {
                settled.put(file, stamp);
            }
        });
        seen = now;
        return settled;
    }

    /** Why the folder could not be read at the last look; empty when it could, or is not there. */
    String problem() {
        return problem;
    }

    private Map<Path, Stamp> jars() throws IOException {
        if (!Files.isDirectory(folder)) {
            return Map.of();
        }
        Map<Path, Stamp> jars = new TreeMap<>();
        try (DirectoryStream<Path> files = Files.newDirectoryStream(folder, FolderWatch::isJar)) {
            files.forEach(file -> jars.put(file, Stamp.of(file)));
        }
        return jars;
    }

    private static boolean isJar(Path file) {
        return file.getFileName().toString().toLowerCase(Locale.ROOT).endsWith(".jar");
    }
}
