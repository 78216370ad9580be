package stirwright.exchange;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import stirwright.exchange.internal.table.TextFile;

/** Bytes to import curves from. They are only read: nothing is ever written to the source. Immutable. */
public final class CurveSource {
    private final String name;
    private final String shown;
    private final byte[] bytes;
    private final String sha256;
    private final boolean pasted;

    private CurveSource(String name, String shown, byte[] bytes, boolean pasted) {
        this.name = name;
        this.shown = shown;
        this.bytes = bytes;
        this.pasted = pasted;
        this.sha256 = HexFormat.of().formatHex(digest().digest(bytes));
    }

    /**
     * Reads a file as it stands now.
     *
     * @throws UnusableFileException when it cannot be read, is empty or is too large
     */
    public static CurveSource file(Path path) {
        return new CurveSource(path.getFileName() == null ? path.toString() : path.getFileName().toString(),
                path.toString(), TextFile.bytes(path, "a text table or a workbook"), false);
    }

    /**
     * Text as a spreadsheet puts it on the clipboard. The hash is that of its UTF-8 bytes.
     *
     * @throws UnusableFileException when it is empty
     */
    public static CurveSource clipboard(String text) {
        if (text.isBlank()) {
            throw new UnusableFileException("clipboard", "holds no text; copy the cells with their header first");
        }
        return new CurveSource("clipboard", "clipboard", text.getBytes(StandardCharsets.UTF_8), true);
    }

    private static MessageDigest digest() {
        try {
            return MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException everyJdkHasIt) {
            throw new IllegalStateException(everyJdkHasIt);
        }
    }

    /** The file's name without its folder, or "clipboard". */
    public String name() {
        return name;
    }

    /** The name without its ending. */
    public String stem() {
        int dot = name.lastIndexOf('.');
        return dot > 0 ? name.substring(0, dot) : name;
    }

    /** As the user named it, for messages. */
    public String shown() {
        return shown;
    }

    /** In hexadecimal. */
    public String sha256() {
        return sha256;
    }

    /** Whether it is text from the clipboard, in UTF-8. */
    public boolean pasted() {
        return pasted;
    }

    /** A copy. */
    public byte[] bytes() {
        return bytes.clone();
    }
}
