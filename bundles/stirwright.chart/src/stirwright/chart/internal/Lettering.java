package stirwright.chart.internal;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Device;
import org.eclipse.swt.graphics.Font;
import org.eclipse.swt.graphics.FontData;
import org.eclipse.swt.graphics.GC;

/** The fonts of a chart and what fits where. */
public final class Lettering {
    private static final String ELLIPSIS = "…";
    private final Font plain;
    private final Font strong;
    private final int height;

    /** From the font that the system gives to windows. */
    public Lettering(Device device, Font base) {
        plain = base;
        FontData[] data = base.getFontData();
        for (FontData one : data) {
            one.setStyle(one.getStyle() | SWT.BOLD);
        }
        strong = new Font(device, data);
        GC gc = new GC(device);
        gc.setFont(plain);
        height = gc.getFontMetrics().getHeight();
        gc.dispose();
    }

    /** For text. */
    public Font plain() {
        return plain;
    }

    /** For what is emphasised. */
    public Font strong() {
        return strong;
    }

    /** Of a line of text, in pixels. */
    public int height() {
        return height;
    }

    /** The width of a text in the GC's font. */
    public static int width(GC gc, String text) {
        return text.isEmpty() ? 0 : gc.textExtent(text, SWT.DRAW_TRANSPARENT).x;
    }

    /** The text, or as much of it as fits with an ellipsis; empty when not even that fits. */
    public static String fit(GC gc, String text, int width) {
        if (width(gc, text) <= width) {
            return text;
        }
        int least = 0;
        int most = text.length();
        while (least < most) {
            int middle = (least + most + 1) / 2;
            if (width(gc, text.substring(0, middle).stripTrailing() + ELLIPSIS) <= width) {
                least = middle;
            } else {
                most = middle - 1;
            }
        }
        return least == 0 ? "" : text.substring(0, least).stripTrailing() + ELLIPSIS;
    }

    /** Gives back what is not the system's. */
    public void dispose() {
        strong.dispose();
    }
}
