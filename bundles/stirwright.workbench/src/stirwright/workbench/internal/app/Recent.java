package stirwright.workbench.internal.app;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Optional;

/** Which study was open when the window closed last. */
final class Recent {
    private static final String KEY = "study";

    private Recent() {}

    static Optional<Path> study() {
        try {
            return Optional.ofNullable(Settings.read().getProperty(KEY)).map(Path::of);
        } catch (InvalidPathException strange) {
            return Optional.empty();
        }
    }

    /** @param file empty when there is none to come back to */
    static void note(Optional<Path> file) {
        Settings.change(s -> file.ifPresentOrElse(f -> s.setProperty(KEY, f.toString()), () -> s.remove(KEY)));
    }
}
