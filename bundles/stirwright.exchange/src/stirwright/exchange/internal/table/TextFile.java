package stirwright.exchange.internal.table;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import stirwright.exchange.UnusableFileException;

/**
 * The text of a file.
 *
 * @param name the file's name without its folder
 * @param path the file as the user named it, for messages
 * @param text decoded, without a byte-order mark
 */
public record TextFile(String name, Path path, String text) {

    /** Room for some 150,000 cases; more is a mistaken file rather than a table. */
    static final int MOST_BYTES = 64 << 20;

    private static final String SAVE_AS = "; save it as CSV in UTF-8";

    /** @throws UnusableFileException when it cannot be read or is not text in UTF-8 */
    public static TextFile read(Path path) {
        byte[] bytes = bytes(path, "a CSV file");
        FileSignature.foreign(bytes).ifPresent(kind -> {
            throw new UnusableFileException(path, "is " + kind + ", not text in UTF-8" + SAVE_AS);
        });
        String text = decode(path, bytes);
        return new TextFile(path.getFileName().toString(), path, text.startsWith("\uFEFF") ? text.substring(1) : text);
    }

    /**
     * The bytes of a file of any kind.
     *
     * @param expected with an article, for the message when it is a folder
     * @throws UnusableFileException when it cannot be read, is empty or is larger than {@link #MOST_BYTES}
     */
    public static byte[] bytes(Path path, String expected) {
        if (Files.isDirectory(path)) {
            throw new UnusableFileException(path, "is a folder; " + expected + " is expected");
        }
        try (InputStream in = Files.newInputStream(path)) {
            byte[] bytes = in.readNBytes(MOST_BYTES + 1);
            if (bytes.length > MOST_BYTES) {
                throw new UnusableFileException(path, "is larger than " + (MOST_BYTES >> 20) + " MB; split it");
            }
            if (bytes.length == 0) {
                throw new UnusableFileException(path, "is empty; a header line and rows are expected");
            }
            return bytes;
        } catch (NoSuchFileException missing) {
            throw new UnusableFileException(path, "there is no such file", missing);
        } catch (AccessDeniedException denied) {
            throw new UnusableFileException(path, "you have no permission to read it", denied);
        } catch (IOException failure) {
            throw new UnusableFileException(path, "cannot be read: " + failure.getMessage(), failure);
        }
    }

    private static String decode(Path path, byte[] bytes) {
        String text = new String(bytes, StandardCharsets.UTF_8);
        if (text.indexOf('\uFFFD') >= 0) {
            requireValid(path, bytes);
        }
        return text;
    }

    /** The replacement character may stand in the file itself, so its sight alone proves nothing. */
    private static void requireValid(Path path, byte[] bytes) {
        CharsetDecoder decoder = StandardCharsets.UTF_8.newDecoder().onMalformedInput(CodingErrorAction.REPORT);
        ByteBuffer in = ByteBuffer.wrap(bytes);
        if (!decoder.decode(in, CharBuffer.allocate(bytes.length), true).isError()) {
            return;
        }
        int line = 1;
        for (int i = 0; i < in.position(); i++) {
            if (bytes[i] == '\n') {
                line++;
            }
        }
        throw new UnusableFileException(path, String.format("line %d holds the byte 0x%02X, which is not UTF-8%s",
                line, bytes[in.position()] & 0xFF, SAVE_AS));
    }
}
