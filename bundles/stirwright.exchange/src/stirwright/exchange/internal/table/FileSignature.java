package stirwright.exchange.internal.table;

import java.util.Optional;

/** Tells what a file is by its bytes, so that it can be read or named. */
public final class FileSignature {

    /** What a file of flow curves can be. */
    public enum Kind { ZIP, OLD_WORKBOOK, PDF, TEXT }

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
                : starts(bytes, '%', 'P', 'D', 'F') ? Kind.PDF : Kind.TEXT;
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
