package stirwright.exchange.internal.curves;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.UnusableFileException;
import stirwright.exchange.internal.table.Texts;

/** The folder in which named choices are kept. */
public final class TemplateFolder {
    private static final String ENDING = ".import";
    private static final Pattern NAME = Pattern.compile("[\\p{L}\\p{N}_-]([\\p{L}\\p{N} _-]{0,58}[\\p{L}\\p{N}_-])?");

    private final Path folder;

    public TemplateFolder(Path folder) {
        this.folder = folder;
    }

    public List<String> list() {
        if (!Files.isDirectory(folder)) {
            return List.of();
        }
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(f -> f.getFileName().toString()).filter(n -> n.endsWith(ENDING))
                    .map(n -> n.substring(0, n.length() - ENDING.length())).sorted().toList();
        } catch (IOException failure) {
            throw new UnusableFileException(folder, "cannot be listed: " + failure.getMessage(), failure);
        }
    }

    public void save(String name, ImportChoice choice) {
        Path file = file(name);
        try {
            Files.createDirectories(folder);
            Files.writeString(file, TemplateText.write(choice));
        } catch (IOException failure) {
            throw new UnusableFileException(file, "cannot be written: " + failure.getMessage(), failure);
        }
    }

    public ImportChoice load(String name) {
        return read(file(name));
    }

    public static ImportChoice read(Path file) {
        try {
            return TemplateText.read(file, Files.readString(file));
        } catch (NoSuchFileException missing) {
            throw new UnusableFileException(file, "there is no such template", missing);
        } catch (IOException failure) {
            throw new UnusableFileException(file, "cannot be read: " + failure.getMessage(), failure);
        }
    }

    public void remove(String name) {
        Path file = file(name);
        try {
            Files.deleteIfExists(file);
        } catch (IOException failure) {
            throw new UnusableFileException(file, "cannot be removed: " + failure.getMessage(), failure);
        }
    }

    private Path file(String name) {
        if (!NAME.matcher(name).matches()) {
            throw new UnusableFileException("template '" + Texts.show(name) + "'",
                    "a name has letters, digits, spaces, hyphens and underscores, at most 60 of them");
        }
        return folder.resolve(name + ENDING);
    }
}
