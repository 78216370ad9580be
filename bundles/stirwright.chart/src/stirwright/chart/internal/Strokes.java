package stirwright.chart.internal;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.LineAttributes;
import stirwright.chart.Palette;

/** The colours, lines and markers of the styles. */
public final class Strokes {
    /** Styles that differ in colour; as many dash patterns and markers. */
    public static final int COUNT = 8;
    /** Line width of a curve in pixels. */
    public static final float THIN = 1.25f;
    /** Line width of the pick in pixels. */
    public static final float PICK = 2.5f;
    /** Opacity of 255 for the part outside a curve's range: 35 %. */
    public static final int OUTSIDE_ALPHA = 89;
    /** Opacity of 255 for the rectangle that a zoom is drawn with: 15 %. */
    public static final int RUBBER_ALPHA = 38;
    /** Opacity of 255 for how far a curve is known: 15 %. */
    public static final int ENVELOPE_ALPHA = 38;
    /** Opacity of 255 for bands behind the curves: 6 %, so that they stay behind them. */
    public static final int BAND_ALPHA = 15;

    /** How much of a measured point is ink, so that the curve that goes through it is seen. */
    private static final double MARK_SHARE = 0.75;
    /** Finer than the dashes of any style. */
    private static final float[] OUTSIDE = {2, 2.5f};
    private static final float[][] DASHES = {null, {9, 3}, {12, 3, 2, 3}, {5, 3}, {18, 4}, {10, 3, 2, 3, 2, 3}, {6, 3, 2, 3},
        {14, 3, 5, 3}};
    private static final Color[] LIGHT = colours(0x0072B2, 0xC24E00, 0xA8457F, 0x2B86BF, 0x9A6500, 0x4F7F1F, 0x7D7000, 0x5B636B);
    private static final Color[] DARK = colours(0x5AA9E6, 0xF0804A, 0xDE96BE, 0x8CCBF0, 0xE9B44C, 0x9CCB6B, 0xE6DC5A, 0xB4BAC0);

    private Strokes() { }

    /** The colour of a style; the pick has the accent. */
    public static Color colour(int style, boolean pick, Palette palette) {
        return pick ? palette.accent() : (palette.isDark() ? DARK : LIGHT)[style % COUNT];
    }

    /** Strokes and gaps in pixels; null for a solid line. Not to be changed. */
    public static float[] dash(int style, boolean pick) {
        return pick ? null : DASHES[(style + 3 * (style / COUNT)) % COUNT];
    }

    /** The marker of a style. */
    public static Marker marker(int style) {
        return Marker.values()[style % COUNT];
    }

    /** The line of a style, within its range or outside, stronger when it is highlighted. */
    public static LineAttributes line(int style, boolean pick, boolean inside, boolean strong) {
        float[] dash = inside ? dash(style, pick) : OUTSIDE;
        return new LineAttributes((pick ? PICK : THIN) + (strong ? THIN : 0), SWT.CAP_FLAT, SWT.JOIN_ROUND,
                dash == null ? SWT.LINE_SOLID : SWT.LINE_CUSTOM, dash, 0, 10);
    }

    /** Makes the GC ready for the filled marks of measured points: in the colour of text, since the colours are the curves'. */
    public static void toMarks(GC gc, boolean used, Palette palette) {
        gc.setLineAttributes(new LineAttributes(THIN));
        // Mixed and not transparent: where the outline lies on the filling it would be darker.
        Color mixed = mixed(palette.text(), palette.page(), used ? MARK_SHARE : OUTSIDE_ALPHA / 255.0);
        gc.setForeground(mixed);
        gc.setBackground(mixed);
    }

    private static Color mixed(Color ink, Color page, double share) {
        return new Color(mixed(ink.getRed(), page.getRed(), share), mixed(ink.getGreen(), page.getGreen(), share),
                mixed(ink.getBlue(), page.getBlue(), share));
    }

    private static int mixed(int ink, int page, double share) {
        return (int) Math.round(share * ink + (1 - share) * page);
    }

    private static Color[] colours(int... hex) {
        Color[] colours = new Color[hex.length];
        for (int i = 0; i < hex.length; i++) {
            colours[i] = new Color(hex[i] >> 16 & 0xFF, hex[i] >> 8 & 0xFF, hex[i] & 0xFF);
        }
        return colours;
    }
}
