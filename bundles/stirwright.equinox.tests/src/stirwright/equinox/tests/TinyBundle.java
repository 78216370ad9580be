package stirwright.equinox.tests;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.jar.Attributes;
import java.util.jar.JarEntry;
import java.util.jar.JarOutputStream;
import java.util.jar.Manifest;

/** Packs a bundle in memory. */
final class TinyBundle {
    private final Manifest manifest = new Manifest();
    private final Map<String, byte[]> files = new LinkedHashMap<>();

    private TinyBundle(String symbolicName) {
        header(Attributes.Name.MANIFEST_VERSION.toString(), "1.0");
        header("Bundle-ManifestVersion", "2");
        header("Bundle-SymbolicName", symbolicName);
        header("Bundle-Version", "1.0.0");
    }

    static TinyBundle named(String symbolicName) {
        return new TinyBundle(symbolicName).header("Import-Package",
                "stirwright.correlation;version=\"[1.0,2)\",org.osgi.framework;version=\"[1.10,2)\"");
    }

    TinyBundle header(String name, String value) {
        manifest.getMainAttributes().putValue(name, value);
        return this;
    }

    TinyBundle file(String path, String text) {
        files.put(path, text.getBytes(StandardCharsets.UTF_8));
        return this;
    }

    /** Copies a class of these tests into the bundle, which then loads its own. */
    TinyBundle holding(Class<?> type) throws IOException {
        try (InputStream in = type.getResourceAsStream(type.getName().replaceAll(".*\\.", "") + ".class")) {
            files.put(type.getName().replace('.', '/') + ".class", in.readAllBytes());
        }
        return this;
    }

    /** Publishes a class as contribution by Declarative Services. */
    TinyBundle component(Class<?> type) throws IOException {
        return holding(type).header("Service-Component", "OSGI-INF/component.xml").file("OSGI-INF/component.xml", """
                <?xml version="1.0" encoding="UTF-8"?>
                <scr:component xmlns:scr="http://www.osgi.org/xmlns/scr/v1.3.0" name="%s">
                  <implementation class="%s"/>
                  <service><provide interface="stirwright.correlation.Contribution"/></service>
                </scr:component>
                """.formatted(type.getSimpleName(), type.getName()));
    }

    byte[] jar() throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (JarOutputStream out = new JarOutputStream(bytes, manifest)) {
            for (Map.Entry<String, byte[]> file : files.entrySet()) {
                out.putNextEntry(new JarEntry(file.getKey()));
                out.write(file.getValue());
                out.closeEntry();
            }
        }
        return bytes.toByteArray();
    }
}
