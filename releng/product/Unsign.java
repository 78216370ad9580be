import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Collections;
import java.util.List;
import java.util.zip.ZipEntry;
import java.util.zip.ZipFile;
import java.util.zip.ZipOutputStream;

/**
 * Takes the signatures off the jars in a folder. Nobody checks them here, but the JVM keeps no class of a signed jar in its
 * class archive, and checks the framework's own at every start: together a third of a second for each start of the window.
 */
final class Unsign {
    private static final String SIGNATURE = "META-INF/[^/]+\\.(SF|RSA|DSA|EC)";

    public static void main(String[] folders) throws IOException {
        for (String folder : folders) {
            try (DirectoryStream<Path> jars = Files.newDirectoryStream(Path.of(folder), "*.jar")) {
                for (Path jar : jars) {
                    unsign(jar);
                }
            }
        }
    }

    private static void unsign(Path jar) throws IOException {
        Path bare = jar.resolveSibling(jar.getFileName() + ".bare");
        try (ZipFile from = new ZipFile(jar.toFile())) {
            // In their order, since a manifest comes first.
            List<? extends ZipEntry> entries = Collections.list(from.entries());
            if (entries.stream().noneMatch(e -> e.getName().matches(SIGNATURE))) {
                return;
            }
            try (OutputStream file = Files.newOutputStream(bare); ZipOutputStream to = new ZipOutputStream(file)) {
                for (ZipEntry entry : entries) {
                    if (!entry.getName().matches(SIGNATURE)) {
                        ZipEntry copy = new ZipEntry(entry.getName());
                        copy.setTime(entry.getTime());
                        to.putNextEntry(copy);
                        from.getInputStream(entry).transferTo(to);
                        to.closeEntry();
                    }
                }
            }
        }
        Files.move(bare, jar, StandardCopyOption.REPLACE_EXISTING);
    }
}
