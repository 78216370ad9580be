package stirwright.trust.internal;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.Locale;
import java.util.regex.Pattern;

/** The hash that stands for a content (FIPS 180-4). */
final class Sha256 {
    private static final Pattern FORM = Pattern.compile("[0-9a-f]{64}");

    private Sha256() {}

    static String of(byte[] content) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(content));
        } catch (NoSuchAlgorithmException missing) {
            throw new IllegalStateException("every Java platform has SHA-256", missing);
        }
    }

    /** @throws IllegalArgumentException when it is not 64 hexadecimal digits */
    static String checked(String text) {
        String lower = text.toLowerCase(Locale.ROOT);
        if (!FORM.matcher(lower).matches()) {
            throw new IllegalArgumentException("'" + text + "' is not a SHA-256 of 64 hexadecimal digits");
        }
        return lower;
    }
}
