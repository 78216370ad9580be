package stirwright.cards.internal;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.regex.Pattern;

/** Writes HTML that is well-formed XML too, so any XML parser can check it. All words are escaped. */
final class Html {
    /** What no XML may hold; a bundle's own words may. */
    private static final Pattern UNWRITABLE = Pattern.compile("[\\p{Cc}\\p{Cs}\\uFFFE\\uFFFF&&[^\\n\\t]]");

    private final StringBuilder text = new StringBuilder();
    private final Deque<String> open = new ArrayDeque<>();

    /** @param attributes name and value in turn */
    Html open(String tag, String... attributes) {
        start(tag, attributes).append('>');
        open.push(tag);
        return this;
    }

    Html close() {
        text.append("</").append(open.pop()).append('>');
        return this;
    }

    /** An element that holds nothing but words. */
    Html leaf(String tag, String words, String... attributes) {
        return open(tag, attributes).words(words).close();
    }

    /** An element that cannot hold anything. */
    Html single(String tag, String... attributes) {
        start(tag, attributes).append("/>");
        return this;
    }

    Html words(String words) {
        text.append(escaped(words));
        return this;
    }

    Html line() {
        text.append('\n');
        return this;
    }

    private StringBuilder start(String tag, String... attributes) {
        text.append('<').append(tag);
        for (int i = 0; i < attributes.length; i += 2) {
            text.append(' ').append(attributes[i]).append("=\"").append(escaped(attributes[i + 1])).append('"');
        }
        return text;
    }

    private static String escaped(String words) {
        return UNWRITABLE.matcher(words).replaceAll("\uFFFD").replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;")
                .replace("\"", "&quot;");
    }

    @Override
    public String toString() {
        if (!open.isEmpty()) {
            throw new IllegalStateException("not closed: " + open);
        }
        return text.toString();
    }
}
