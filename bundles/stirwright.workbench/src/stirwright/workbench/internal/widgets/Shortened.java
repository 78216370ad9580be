package stirwright.workbench.internal.widgets;

import java.util.HashMap;
import java.util.Map;
import org.eclipse.swt.graphics.GC;

/** Text that is wider than its place ends in an ellipsis instead of being cut through. Remembers what it measured. */
public final class Shortened {
    private static final String ELLIPSIS = "\u2026";
    private static final int MOST = 4000;

    private final Map<String, String> known = new HashMap<>();

    public String fit(GC gc, String text, int width) {
        if (text.isEmpty() || width <= 0) {
            return text;
        }
        if (known.size() > MOST) {
            known.clear();
        }
        return known.computeIfAbsent(width + " " + text, key -> measure(gc, text, width));
    }

    private static String measure(GC gc, String text, int width) {
        if (gc.textExtent(text).x <= width) {
            return text;
        }
        int fits = 0;
        int tooLong = text.length();
        while (tooLong - fits > 1) {
            int middle = (fits + tooLong) / 2;
            if (gc.textExtent(text.substring(0, middle).stripTrailing() + ELLIPSIS).x <= width) {
                fits = middle;
            } else {
                tooLong = middle;
            }
        }
        return text.substring(0, fits).stripTrailing() + ELLIPSIS;
    }
}
