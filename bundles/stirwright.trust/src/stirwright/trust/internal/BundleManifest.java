package stirwright.trust.internal;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.util.jar.Attributes;
import java.util.jar.Manifest;
import java.util.regex.Pattern;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import org.osgi.framework.Constants;
import org.osgi.framework.Version;

/** What a jar's manifest says of the bundle; nothing of the jar is run. */
record BundleManifest(String name, String version) {
    private static final String PATH = "META-INF/MANIFEST.MF";

    /** Common practice, no source: manifests are a few KiB; more is a defect or meant to fill the memory. */
    private static final int LIMIT = 1 << 20;

    /** Common practice, no source: no jar that a tool packed has this much, unpacked, in front of its manifest. */
    private static final long BEFORE = 64L << 20;

    /** OSGi Core 8, 1.3.2: a symbolic name is made of tokens and dots. */
    private static final Pattern NAME = Pattern.compile("[A-Za-z0-9_.-]+");

    /** @throws NotUsableException when the content is no jar, or a jar that is no bundle of its own */
    static BundleManifest of(byte[] content) throws NotUsableException {
        Attributes headers = manifest(content).getMainAttributes();
        String header = headers.getValue(Constants.BUNDLE_SYMBOLICNAME);
        String name = header == null ? "" : header.split(";", -1)[0].strip();
        if (name.isEmpty()) {
            throw new NotUsableException("is a jar but not a bundle: its manifest has no " + Constants.BUNDLE_SYMBOLICNAME);
        }
        if (!NAME.matcher(name).matches()) {
            throw new NotUsableException("has a " + Constants.BUNDLE_SYMBOLICNAME + " with other characters than letters, digits,"
                    + " '.', '-' and '_'");
        }
        if (headers.getValue(Constants.FRAGMENT_HOST) != null) {
            throw new NotUsableException("is a fragment of " + headers.getValue(Constants.FRAGMENT_HOST)
                    + "; only bundles of their own are taken");
        }
        return new BundleManifest(name, version(headers.getValue(Constants.BUNDLE_VERSION)));
    }

    private static String version(String text) throws NotUsableException {
        try {
            return Version.parseVersion(text).toString();
        } catch (IllegalArgumentException malformed) {
            throw new NotUsableException("has the " + Constants.BUNDLE_VERSION + " '" + text
                    + "', which is no version of the form 1.2.3");
        }
    }

    private static Manifest manifest(byte[] content) throws NotUsableException {
        boolean jar = false;
        long left = BEFORE;
        // Not every tool writes the manifest first, where some readers look for it.
        try (ZipInputStream in = new ZipInputStream(new ByteArrayInputStream(content))) {
            for (ZipEntry entry = in.getNextEntry(); entry != null; entry = in.getNextEntry()) {
                jar = true;
                if (entry.getName().equalsIgnoreCase(PATH)) {
                    byte[] text = in.readNBytes(LIMIT + 1);
                    if (text.length > LIMIT) {
                        throw new NotUsableException("has a manifest of more than 1 MiB");
                    }
                    return new Manifest(new ByteArrayInputStream(text));
                }
                left = unpack(in, left);
            }
        } catch (IOException | IllegalArgumentException damaged) {
            // IllegalArgumentException: names of entries that are not in UTF-8.
            throw new NotUsableException("is not a readable jar: " + damaged.getMessage());
        }
        throw new NotUsableException(jar ? "has no " + PATH + ", so it is not a bundle" : "is not a jar");
    }

    /** Passes over an entry. @return what may be unpacked after it, in bytes */
    private static long unpack(ZipInputStream in, long limit) throws IOException, NotUsableException {
        byte[] part = new byte[1 << 13];
        long left = limit;
        for (int read = in.read(part); read >= 0; read = in.read(part)) {
            left -= read;
            if (left < 0) {
                throw new NotUsableException("has more than " + (BEFORE >> 20) + " MiB, unpacked, before its manifest");
            }
        }
        return left;
    }
}
