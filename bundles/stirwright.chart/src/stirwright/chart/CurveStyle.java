package stirwright.chart;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.LineAttributes;
import org.eclipse.swt.graphics.Rectangle;
import stirwright.chart.internal.Strokes;

/**
 * How curves are told apart: by colour, dash pattern and marker, each sufficient by itself among the first eight. Later
 * styles combine a colour with another dash pattern, so that the first 64 differ also without colour.
 *
 * <p>The hues follow the colour-blind-safe set of M. Okabe and K. Ito, "Color Universal Design (CUD): how to make figures
 * and presentations that are friendly to colorblind people", 2002, revised 2008. Ours are darker on the light page and
 * lighter on the dark page, so that each has a contrast of at least 3:1 with the page and the raised surface, which WCAG
 * 2.2, success criterion 1.4.11, asks of graphics. Their bluish green has become a leaf green, since the accent colour is a
 * bluish green too, and their black has become the grey of secondary text.
 */
public final class CurveStyle {
    /** Styles that differ in colour. */
    public static final int COLOURS = Strokes.COUNT;

    private CurveStyle() { }

    /** The colour of a curve; the pick has the accent colour. */
    public static Color colour(int style, boolean pick, Palette palette) {
        return Strokes.colour(style, pick, palette);
    }

    /** Lengths of strokes and gaps in pixels; empty for a solid line, which the pick has. */
    public static float[] dash(int style, boolean pick) {
        float[] dash = Strokes.dash(style, pick);
        return dash == null ? new float[0] : dash.clone();
    }

    /**
     * Paints a sample of a style, for instance as a legend in a table: a line across the rectangle at half its height, with
     * the style's marker in the middle. Leaves the GC as it was.
     *
     * @param area some 32 to 48 pixels wide shows a dash pattern whole
     */
    public static void paintSwatch(GC gc, Rectangle area, int style, boolean pick, Palette palette) {
        LineAttributes line = gc.getLineAttributes();
        Color foreground = gc.getForeground();
        Color background = gc.getBackground();
        int antialias = gc.getAntialias();
        int y = area.y + area.height / 2;
        gc.setAntialias(SWT.ON);
        gc.setForeground(colour(style, pick, palette));
        gc.setLineAttributes(Strokes.line(style, pick, true, false));
        gc.drawLine(area.x + 1, y, area.x + area.width - 1, y);
        if (!pick) {
            gc.setBackground(palette.page());
            gc.setLineAttributes(new LineAttributes(Strokes.THIN));
            Strokes.marker(style).draw(gc, area.x + area.width / 2, y);
        }
        gc.setAntialias(antialias);
        gc.setForeground(foreground);
        gc.setBackground(background);
        gc.setLineAttributes(line);
    }

    /**
     * Paints the mark of measured points in the middle of a rectangle, for instance as a legend in a table. Leaves the GC as
     * it was.
     */
    public static void paintMark(GC gc, Rectangle area, int style, boolean used, Palette palette) {
        LineAttributes line = gc.getLineAttributes();
        Color foreground = gc.getForeground();
        Color background = gc.getBackground();
        int antialias = gc.getAntialias();
        gc.setAntialias(SWT.ON);
        Strokes.toMarks(gc, used, palette);
        Strokes.marker(style).draw(gc, area.x + area.width / 2, area.y + area.height / 2);
        gc.setAntialias(antialias);
        gc.setForeground(foreground);
        gc.setBackground(background);
        gc.setLineAttributes(line);
    }
}
