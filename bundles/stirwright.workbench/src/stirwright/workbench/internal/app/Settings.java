package stirwright.workbench.internal.app;

import java.io.IOException;
import java.io.Reader;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Properties;
import java.util.function.Consumer;
import stirwright.trust.UserFolder;

/** What the window remembers for its user. Nothing of it is worth a message: what cannot be read or kept is forgotten. */
final class Settings {

    private Settings() {}

    private static Path file() {
        return UserFolder.path().resolve("window.properties");
    }

    static Properties read() {
        Properties settings = new Properties();
        try (Reader in = Files.newBufferedReader(file())) {
            settings.load(in);
        } catch (IOException | IllegalArgumentException unreadable) {
            settings.clear();
        }
        return settings;
    }

    static void change(Consumer<Properties> change) {
        Properties settings = read();
        change.accept(settings);
        try {
            Files.createDirectories(file().getParent());
            Path fresh = Files.createTempFile(file().getParent(), "window", ".new");
            try (Writer out = Files.newBufferedWriter(fresh)) {
                settings.store(out, null);
            }
            Files.move(fresh, file(), StandardCopyOption.REPLACE_EXISTING);
        } catch (IOException unwritable) {
            // Sizes that are not kept do not stop anybody's work.
        }
    }
}
