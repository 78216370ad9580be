package stirwright.trust;

import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import java.util.function.UnaryOperator;

/** Where this user's settings are kept: the list of approved bundles, the window's sizes. */
public final class UserFolder {
    /** The system property that names another folder. */
    public static final String PROPERTY = "stirwright.settings";

    private UserFolder() {}

    /** The folder; it need not exist yet. */
    public static Path path() {
        return of(System::getProperty, System::getenv);
    }

    /** @param property and {@code variable} give null for what is not set */
    static Path of(UnaryOperator<String> property, UnaryOperator<String> variable) {
        String given = property.apply(PROPERTY);
        if (given != null && !given.isBlank()) {
            return Path.of(given).toAbsolutePath();
        }
        String home = property.apply("user.home");
        String system = property.apply("os.name").toLowerCase(Locale.ROOT);
        if (system.startsWith("mac")) {
            return Path.of(home, "Library", "Application Support", "Stirwright");
        }
        if (system.startsWith("windows")) {
            return absolute(variable.apply("APPDATA")).orElse(Path.of(home, "AppData", "Roaming")).resolve("Stirwright");
        }
        // The XDG base directory specification wants paths that are not absolute ignored.
        return absolute(variable.apply("XDG_CONFIG_HOME")).orElse(Path.of(home, ".config")).resolve("stirwright");
    }

    private static Optional<Path> absolute(String folder) {
        return Optional.ofNullable(folder).filter(f -> !f.isBlank()).map(Path::of).filter(Path::isAbsolute);
    }
}
