package stirwright.exchange.internal.table;

import java.nio.charset.StandardCharsets;
import java.util.Optional;
import java.util.regex.Pattern;

/** Tells what a file is by its bytes, so that it can be read or named. */
public final class FileSignature {

    /** What a file of flow curves can be. */
    public enum Kind { ZIP, OLD_WORKBOOK, PDF, WEB_PAGE, IMAGE, TEXT }

    private static final int BEGINNING = 500;
    /** Some programs give tables of a web page the ending of a workbook. */
    private static final Pattern WEB_PAGE = Pattern.compile("(?:\\u00EF\\u00BB\\u00BF)?\\s*<(?:!doctype\\s+html|html|head|body|table|meta|style|\\?xml)\\b",
            Pattern.CASE_INSENSITIVE);

    private FileSignature() {}

    /** In words with an article; empty when nothing speaks against text. */
    static Optional<String> foreign(byte[] bytes) {
        if (starts(bytes, 0xFF, 0xFE) || starts(bytes, 0xFE, 0xFF)) {
            return Optional.of("UTF-16 text");
        }
        if (starts(bytes, 'P', 'K', 3, 4)) {
            return Optional.of("a workbook or another zip archive");
        }
        if (starts(bytes, 0xD0, 0xCF, 0x11, 0xE0)) {
            return Optional.of("a workbook in an old binary format");
        }
        if (starts(bytes, '%', 'P', 'D', 'F')) {
            return Optional.of("a PDF document");
        }
        return zeros(bytes);
    }

    /** By its first bytes; text of any kind when nothing speaks against it. */
    public static Kind of(byte[] bytes) {
        if (starts(bytes, 'P', 'K', 3, 4) || starts(bytes, 'P', 'K', 5, 6)) {
            return Kind.ZIP;
        }
        return starts(bytes, 0xD0, 0xCF, 0x11, 0xE0) ? Kind.OLD_WORKBOOK
                : starts(bytes, '%', 'P', 'D', 'F') ? Kind.PDF
                : starts(bytes, 0x89, 'P', 'N', 'G') || starts(bytes, 0xFF, 0xD8, 0xFF) || starts(bytes, 'G', 'I', 'F', '8') ? Kind.IMAGE
                : WEB_PAGE.matcher(new String(bytes, 0, Math.min(bytes.length, BEGINNING), StandardCharsets.ISO_8859_1)).lookingAt()
                ? Kind.WEB_PAGE : Kind.TEXT;
    }

    private static boolean starts(byte[] bytes, int... signature) {
        if (bytes.length < signature.length) {
            return false;
        }
        for (int i = 0; i < signature.length; i++) {
            if ((bytes[i] & 0xFF) != signature[i]) {
                return false;
            }
        }
        return true;
    }

    /** No text holds a zero byte; in UTF-16 without a mark nearly every second byte is one. */
    private static Optional<String> zeros(byte[] bytes) {
        int[] zeros = new int[2];
        for (int i = 0; i < bytes.length; i++) {
            if (bytes[i] == 0) {
                zeros[i & 1]++;
            }
        }
        if (zeros[0] + zeros[1] == 0) {
            return Optional.empty();
        }
        boolean everySecond = Math.max(zeros[0], zeros[1]) > bytes.length / 4
                && Math.min(zeros[0], zeros[1]) <= bytes.length / 50;
        return Optional.of(everySecond ? "UTF-16 text" : "a binary file");
    }
}
