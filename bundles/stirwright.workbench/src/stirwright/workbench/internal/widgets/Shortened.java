package stirwright.workbench.internal.widgets;

import java.util.HashMap;
import java.util.Map;
import java.util.function.BiFunction;
import org.eclipse.swt.graphics.GC;

/** Text that is wider than its place has an ellipsis instead of being cut through. Remembers what it measured in one font. */
public final class Shortened {
    private static final String ELLIPSIS = "\u2026";
    private static final int MOST = 4000;
    /** Of what is kept of a text that keeps its end, the part that stands before the ellipsis. */
    private static final int START = 3;

    private final Map<String, String> known = new HashMap<>();

    /** Leaves out the end. */
    public String fit(GC gc, String text, int width) {
        return fit(gc, text, width, (words, kept) -> words.substring(0, kept).stripTrailing() + ELLIPSIS);
    }

    /** Leaves out whole words before the last two thirds of what it keeps. */
    public String fitMiddle(GC gc, String text, int width) {
        return fit(gc, text, width, Shortened::withoutMiddle);
    }

    private static String withoutMiddle(String text, int kept) {
        String start = text.substring(0, kept / START);
        String end = text.substring(text.length() - kept + kept / START);
        // A word that was cut through goes, unless it is all there is.
        int last = start.lastIndexOf(' ');
        int first = end.indexOf(' ');
        return start.substring(0, last < 0 ? start.length() : last) + ELLIPSIS + end.substring(first < 0 ? 0 : first + 1);
    }

    private String fit(GC gc, String text, int width, BiFunction<String, Integer, String> shorter) {
        if (text.isEmpty() || width <= 0) {
            return text;
        }
        if (known.size() > MOST) {
            known.clear();
        }
        return known.computeIfAbsent(width + " " + text, key -> measure(gc, text, width, shorter));
    }

    private static String measure(GC gc, String text, int width, BiFunction<String, Integer, String> shorter) {
        if (gc.textExtent(text).x <= width) {
            return text;
        }
        int fits = 0;
        int tooLong = text.length();
        while (tooLong - fits > 1) {
            int middle = (fits + tooLong) / 2;
            if (gc.textExtent(shorter.apply(text, middle)).x <= width) {
                fits = middle;
            } else {
                tooLong = middle;
            }
        }
        return shorter.apply(text, fits);
    }
}
