package stirwright.conformance.internal;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.util.jar.Attributes;
import java.util.jar.Manifest;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import org.osgi.framework.Constants;
import stirwright.conformance.JarRefusedException;

/** What the manifest of a bundle says before it is installed. */
public record BundleFile(String symbolicName) {
    private static final String MANIFEST = "META-INF/MANIFEST.MF";

    /**
     * @param name as messages name the file
     * @throws JarRefusedException when it is no jar, or a jar without a bundle's manifest
     */
    public static BundleFile of(String name, byte[] content) throws JarRefusedException {
        Attributes headers = manifest(name, content).getMainAttributes();
        String symbolicName = headers.getValue(Constants.BUNDLE_SYMBOLICNAME);
        if (symbolicName == null || symbolicName.isBlank()) {
            throw new JarRefusedException(name + " is a jar but not a bundle: its manifest has no "
                    + Constants.BUNDLE_SYMBOLICNAME);
        }
        if (headers.getValue(Constants.FRAGMENT_HOST) != null) {
            throw new JarRefusedException(name + " is a fragment of " + headers.getValue(Constants.FRAGMENT_HOST)
                    + "; a contribution is a bundle of its own");
        }
        return new BundleFile(symbolicName.split(";")[0].strip());
    }

    private static Manifest manifest(String name, byte[] content) throws JarRefusedException {
        boolean jar = false;
        // Not every tool writes the manifest first, where some readers look for it.
        try (ZipInputStream in = new ZipInputStream(new ByteArrayInputStream(content))) {
            for (ZipEntry entry = in.getNextEntry(); entry != null; entry = in.getNextEntry()) {
                jar = true;
                if (entry.getName().equalsIgnoreCase(MANIFEST)) {
                    return new Manifest(in);
                }
            }
        } catch (IOException damaged) {
            throw new JarRefusedException(name + " is not a readable jar: " + damaged.getMessage());
        }
        throw new JarRefusedException(name + (jar ? " has no " + MANIFEST + ", so it is not a bundle" : " is not a jar"));
    }
}
