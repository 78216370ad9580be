package stirwright.exchange.internal.workbook;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.HashMap;
import java.util.Map;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import stirwright.exchange.UnusableFileException;

/** The parts of a workbook's archive that hold cells, unpacked within limits. */
final class ZipParts {
    /** Unpacked, all parts together; some 300,000 rows. A small archive can grow without end. */
    static final long MOST_BYTES = 128L << 20;
    static final int MOST_PARTS = 5_000;

    private final Map<String, byte[]> parts = new HashMap<>();
    private long total;

    /** @throws UnusableFileException when the archive is broken or grows beyond the limits */
    ZipParts(String shown, byte[] bytes) {
        try (ZipInputStream zip = new ZipInputStream(new ByteArrayInputStream(bytes))) {
            int count = 0;
            for (ZipEntry entry = zip.getNextEntry(); entry != null; entry = zip.getNextEntry()) {
                if (++count > MOST_PARTS) {
                    throw new UnusableFileException(shown, "has more than " + MOST_PARTS + " parts; save the sheet as CSV");
                }
                String name = entry.getName().startsWith("/") ? entry.getName().substring(1) : entry.getName();
                byte[] part = unpack(shown, zip, wanted(name));
                if (wanted(name)) {
                    parts.putIfAbsent(name, part);
                }
            }
        } catch (IOException | IllegalArgumentException broken) {
            // ZipInputStream says IllegalArgumentException of names that are no text.
            throw new UnusableFileException(shown, "is a broken archive (" + broken.getMessage()
                    + "); open it in a spreadsheet and save it again", broken);
        }
    }

    private byte[] unpack(String shown, ZipInputStream zip, boolean keep) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        byte[] buffer = new byte[1 << 16];
        for (int n = zip.read(buffer); n >= 0; n = zip.read(buffer)) {
            total += n;
            if (total > MOST_BYTES) {
                throw new UnusableFileException(shown, "grows to more than " + (MOST_BYTES >> 20)
                        + " MB when it is unpacked; save the sheet with the flow curve as CSV");
            }
            if (keep) {
                out.write(buffer, 0, n);
            }
        }
        return out.toByteArray();
    }

    private static boolean wanted(String name) {
        return name.equals("mimetype") || name.startsWith("xl/") && (name.endsWith(".xml") || name.endsWith(".rels"))
                || name.equals("xl/workbook.bin") || name.equals("[Content_Types].xml");
    }

    boolean has(String name) {
        return parts.containsKey(name);
    }

    /** Empty without the part. */
    byte[] part(String name) {
        return parts.getOrDefault(name, new byte[0]);
    }
}
