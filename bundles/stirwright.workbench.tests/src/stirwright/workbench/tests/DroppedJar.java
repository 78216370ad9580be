package stirwright.workbench.tests;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.security.MessageDigest;
import java.util.HexFormat;
import java.util.jar.JarEntry;
import java.util.jar.JarOutputStream;
import java.util.jar.Manifest;

/** The jar of {@link DroppedFamily}, and the folder that it is dropped into. */
final class DroppedJar {
    private static final Path FOLDER = Path.of(System.getProperty("stirwright.families"));

    private DroppedJar() {}

    /** Packed once, since an archive holds the time of its packing. */
    private static byte[] packed;

    static synchronized byte[] bytes() throws Exception {
        if (packed == null) {
            packed = pack();
        }
        return packed;
    }

    private static byte[] pack() throws Exception {
        Manifest manifest = new Manifest(new ByteArrayInputStream("""
                Manifest-Version: 1.0
                Bundle-ManifestVersion: 2
                Bundle-SymbolicName: dropped.paddle
                Bundle-Version: 1.0.0
                Service-Component: OSGI-INF/family.xml
                Import-Package: stirwright.correlation;version="[1.0,2)"
                """.getBytes(StandardCharsets.UTF_8)));
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (JarOutputStream out = new JarOutputStream(bytes, manifest)) {
            put(out, "OSGI-INF/family.xml", """
                    <?xml version="1.0" encoding="UTF-8"?>
                    <scr:component xmlns:scr="http://www.osgi.org/xmlns/scr/v1.3.0" name="dropped">
                      <implementation class="%s"/>
                      <service><provide interface="stirwright.correlation.Contribution"/></service>
                    </scr:component>
                    """.formatted(DroppedFamily.class.getName()).getBytes(StandardCharsets.UTF_8));
            String path = DroppedFamily.class.getName().replace('.', '/') + ".class";
            try (InputStream in = DroppedFamily.class.getResourceAsStream("/" + path)) {
                put(out, path, in.readAllBytes());
            }
        }
        return bytes.toByteArray();
    }

    private static void put(JarOutputStream out, String name, byte[] content) throws IOException {
        JarEntry entry = new JarEntry(name);
        entry.setTime(0);
        out.putNextEntry(entry);
        out.write(content);
        out.closeEntry();
    }

    static String sha256(byte[] content) throws Exception {
        return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(content));
    }

    /** Drops a file as a file manager does: whole, under its name. */
    static Path drop(String name, byte[] content) throws IOException {
        Files.createDirectories(FOLDER);
        Path part = Files.write(FOLDER.resolveSibling(name + ".part"), content);
        return Files.move(part, FOLDER.resolve(name), StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
    }
}
