package stirwright.trust.internal;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;

/** Jars in memory, sound and not. */
final class Jars {

    private Jars() {}

    /** @param headers without the manifest's own version */
    static byte[] bundle(String... headers) throws IOException {
        return zip("META-INF/MANIFEST.MF", "Manifest-Version: 1.0\n" + String.join("\n", headers) + "\n");
    }

    /** @param entries path, text, path, text ... */
    static byte[] zip(String... entries) throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ZipOutputStream out = new ZipOutputStream(bytes)) {
            for (int i = 0; i < entries.length; i += 2) {
                out.putNextEntry(new ZipEntry(entries[i]));
                out.write(entries[i + 1].getBytes(StandardCharsets.UTF_8));
                out.closeEntry();
            }
        }
        return bytes.toByteArray();
    }
}
