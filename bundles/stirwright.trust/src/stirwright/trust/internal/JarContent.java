package stirwright.trust.internal;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;

/**
 * A file, read once: hash, manifest and what may be installed all come from the same bytes.
 *
 * @param bytes null when it could not be read
 * @param refusal why it can never become a bundle, approved or not; empty when it can
 */
record JarContent(byte[] bytes, String sha256, String name, String version, String refusal) {
    /** The largest file that is read, in bytes: 64 MiB. Common practice, no source: families are some 100 KiB. */
    static final int LIMIT = 64 << 20;

    static JarContent read(Path file) {
        return read(file, LIMIT);
    }

    static JarContent read(Path file, int limit) {
        byte[] bytes;
        // What the file's size is said to be is not relied on: it may grow while it is read.
        try (InputStream in = Files.newInputStream(file)) {
            bytes = in.readNBytes(limit + 1);
        } catch (IOException unreadable) {
            return unread(words(file, unreadable));
        }
        if (bytes.length > limit) {
            return unread("is larger than " + (limit >> 20) + " MiB and is not read");
        }
        String sha256 = Sha256.of(bytes);
        try {
            BundleManifest manifest = BundleManifest.of(bytes);
            return new JarContent(bytes, sha256, manifest.name(), manifest.version(), "");
        } catch (NotUsableException refused) {
            return new JarContent(bytes, sha256, "", "", refused.getMessage());
        } catch (RuntimeException defect) {
            // Whatever a jar made by nobody knows whom runs into, it must not keep the others from being looked at.
            return new JarContent(bytes, sha256, "", "", "cannot be read as a jar: " + defect);
        }
    }

    private static JarContent unread(String refusal) {
        return new JarContent(null, "", "", "", refusal);
    }

    private static String words(Path file, IOException unreadable) {
        if (unreadable instanceof NoSuchFileException) {
            return "is not there";
        }
        return Files.isDirectory(file) ? "is a folder, not a jar"
                : "cannot be read: " + (unreadable instanceof AccessDeniedException ? "access is denied" : unreadable.getMessage());
    }

    /** The same without the bytes, which are not kept for files that wait. */
    JarContent withoutBytes() {
        return new JarContent(null, sha256, name, version, refusal);
    }
}
