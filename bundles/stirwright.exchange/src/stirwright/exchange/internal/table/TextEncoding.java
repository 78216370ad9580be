package stirwright.exchange.internal.table;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.Charset;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.IllegalCharsetNameException;
import java.nio.charset.StandardCharsets;
import java.nio.charset.UnsupportedCharsetException;
import java.util.Optional;
import stirwright.exchange.UnusableFileException;

/**
 * A text and how its bytes were read.
 *
 * @param name of the character set
 * @param reason why this one
 */
public record TextEncoding(String text, String name, String reason) {
    private static final String ANSI = "windows-1252";

    /** @throws UnusableFileException when the bytes are no text */
    public static TextEncoding detect(String shown, byte[] bytes) {
        TextEncoding found = marked(bytes).or(() -> sixteen(bytes)).orElseGet(() -> utf8(bytes).orElseGet(() ->
                new TextEncoding(decoded(bytes, 0, Charset.forName(ANSI)), ANSI,
                        "the bytes are not UTF-8; any other one-byte character set differs in letters beyond a to z only")));
        requireText(shown, found.text());
        return found;
    }

    /** @throws UnusableFileException when the JDK has no such character set, or the bytes are no text in it */
    public static TextEncoding chosen(String shown, byte[] bytes, String name) {
        try {
            Charset charset = Charset.forName(name);
            String text = decoded(bytes, 0, charset);
            requireText(shown, text);
            return new TextEncoding(text.startsWith("\uFEFF") ? text.substring(1) : text, charset.name(), "chosen by hand");
        } catch (IllegalCharsetNameException | UnsupportedCharsetException unknown) {
            throw new UnusableFileException(shown, "there is no character set '" + Texts.show(name)
                    + "'; UTF-8, UTF-16LE, windows-1252 or ISO-8859-15 for instance", unknown);
        }
    }

    private static Optional<TextEncoding> marked(byte[] bytes) {
        if (starts(bytes, 0xEF, 0xBB, 0xBF)) {
            return Optional.of(byMark(bytes, 3, StandardCharsets.UTF_8));
        }
        if (starts(bytes, 0xFF, 0xFE, 0, 0)) {
            return Optional.of(byMark(bytes, 4, Charset.forName("UTF-32LE")));
        }
        if (starts(bytes, 0xFF, 0xFE)) {
            return Optional.of(byMark(bytes, 2, StandardCharsets.UTF_16LE));
        }
        return starts(bytes, 0xFE, 0xFF) ? Optional.of(byMark(bytes, 2, StandardCharsets.UTF_16BE)) : Optional.empty();
    }

    private static TextEncoding byMark(byte[] bytes, int skipped, Charset charset) {
        return new TextEncoding(decoded(bytes, skipped, charset), charset.name(), "by its byte-order mark");
    }

    /** Latin letters and digits in UTF-16 have a zero byte each; no other text has any. */
    private static Optional<TextEncoding> sixteen(byte[] bytes) {
        int[] zeros = new int[2];
        for (int i = 0; i < bytes.length; i++) {
            if (bytes[i] == 0) {
                zeros[i & 1]++;
            }
        }
        if (Math.max(zeros[0], zeros[1]) <= bytes.length / 4 || Math.min(zeros[0], zeros[1]) > bytes.length / 50) {
            return Optional.empty();
        }
        Charset charset = zeros[1] > zeros[0] ? StandardCharsets.UTF_16LE : StandardCharsets.UTF_16BE;
        return Optional.of(new TextEncoding(decoded(bytes, 0, charset), charset.name(), "every second byte is zero"));
    }

    private static Optional<TextEncoding> utf8(byte[] bytes) {
        try {
            String text = StandardCharsets.UTF_8.newDecoder().onMalformedInput(CodingErrorAction.REPORT)
                    .decode(ByteBuffer.wrap(bytes)).toString();
            boolean plain = text.length() == bytes.length;
            return Optional.of(new TextEncoding(text, "UTF-8",
                    plain ? "plain ASCII, which most character sets read alike" : "the bytes are valid UTF-8"));
        } catch (CharacterCodingException other) {
            return Optional.empty();
        }
    }

    private static String decoded(byte[] bytes, int skipped, Charset charset) {
        return new String(bytes, skipped, bytes.length - skipped, charset);
    }

    /** A few stray bytes leave a text readable; more than one in fifty are no text. */
    private static void requireText(String shown, String text) {
        int strange = 0;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            strange += c < ' ' && c != '\t' && c != '\n' && c != '\r' && c != '\f' || c == '\uFFFD' ? 1 : 0;
        }
        if (strange > 20 && strange > text.length() / 50) {
            throw new UnusableFileException(shown, "is no text: " + strange + " of " + text.length()
                    + " characters cannot be read; save it as CSV in UTF-8 or as .xlsx, or name its encoding");
        }
    }

    private static boolean starts(byte[] bytes, int... signature) {
        for (int i = 0; i < signature.length; i++) {
            if (i >= bytes.length || (bytes[i] & 0xFF) != signature[i]) {
                return false;
            }
        }
        return true;
    }
}
