package stirwright.console.internal;

import java.util.regex.Pattern;

/** Text of others, such as names of files and what jars say, as a terminal shows it and does not obey it. */
final class Plain {
    private static final Pattern UNSEEN = Pattern.compile("[\\p{Cc}\\p{Cf}\\p{Zl}\\p{Zp}&&[^\\n]]");

    private Plain() {}

    /** Characters that have no form of their own become the replacement character; lines stay lines. */
    static String text(CharSequence text) {
        return UNSEEN.matcher(text).replaceAll("\uFFFD");
    }

    static String line(String text) {
        return text(text.replace('\n', ' '));
    }
}
