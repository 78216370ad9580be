package stirwright.trust.internal;

import java.io.File;
import java.nio.file.Path;
import org.osgi.framework.BundleContext;

/** Where the folder of dropped bundles is. */
final class Settings {
    /** The system property that names another folder. */
    private static final String PROPERTY = "stirwright.families";

    private static final String FILE_URL = "file:";

    private Settings() {}

    static Path families(BundleContext context) {
        String given = System.getProperty(PROPERTY);
        if (given != null && !given.isBlank()) {
            return Path.of(given).toAbsolutePath();
        }
        String installation = context.getProperty("osgi.install.area");
        // The platform writes a URL in which nothing is escaped.
        String path = installation == null ? "" : installation.startsWith(FILE_URL)
                ? installation.substring(FILE_URL.length()) : installation;
        return new File(path).toPath().toAbsolutePath().resolve("families");
    }
}
