package stirwright.chart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.HashSet;
import java.util.Set;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.RGB;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Display;
import org.junit.jupiter.api.Test;

class CurveStyleTest {
    private static final int WIDE = 120;
    private static final int HIGH = 16;

    /** Relative luminance as WCAG 2.2 defines it. */
    private static double luminance(Color colour) {
        return 0.2126 * linear(colour.getRed()) + 0.7152 * linear(colour.getGreen()) + 0.0722 * linear(colour.getBlue());
    }

    private static double linear(int channel) {
        double part = channel / 255.0;
        return part <= 0.04045 ? part / 12.92 : Math.pow((part + 0.055) / 1.055, 2.4);
    }

    private static double contrast(Color one, Color other) {
        double a = luminance(one);
        double b = luminance(other);
        return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
    }

    /** The contrast of black and white is 21:1 by definition, so the measure itself holds. */
    @Test
    void everyColourStandsOutFromItsPage() {
        assertEquals(21, contrast(new Color(0, 0, 0), new Color(255, 255, 255)), 1e-9);
        for (Palette palette : new Palette[] {Palette.light(), Palette.dark()}) {
            for (int style = 0; style < CurveStyle.COLOURS; style++) {
                Color colour = CurveStyle.colour(style, false, palette);
                assertTrue(contrast(colour, palette.page()) >= 3, colour + " on the page");
                assertTrue(contrast(colour, palette.surface()) >= 3, colour + " on the surface");
            }
            assertTrue(contrast(palette.accent(), palette.page()) >= 3);
            assertTrue(contrast(palette.quiet(), palette.page()) >= 4.5, "secondary text is text");
        }
    }

    @Test
    void twentyFourStylesCombineColourAndDashAnew() {
        Set<String> seen = new HashSet<>();
        for (int style = 0; style < 24; style++) {
            seen.add(CurveStyle.colour(style, false, Palette.light()) + Arrays.toString(CurveStyle.dash(style, false)));
        }
        assertEquals(24, seen.size());
        assertEquals(0, CurveStyle.dash(3, true).length, "the pick is solid");
    }

    /** Where the swatch is inked, without any colour: dark and light count the same. */
    private static boolean[] pattern(int style, boolean pick, Palette palette) {
        Image image = new Image(Display.getDefault(), WIDE, HIGH);
        GC gc = new GC(image);
        gc.setBackground(palette.page());
        gc.fillRectangle(0, 0, WIDE, HIGH);
        CurveStyle.paintSwatch(gc, new Rectangle(0, 0, WIDE, HIGH), style, pick, palette);
        gc.dispose();
        ImageData data = image.getImageData();
        image.dispose();
        boolean[] inked = new boolean[WIDE * HIGH];
        for (int i = 0; i < inked.length; i++) {
            inked[i] = new Pixels(data, palette).covered(i % WIDE, i / WIDE, CurveStyle.colour(style, pick, palette)) > 0.4;
        }
        return inked;
    }

    @Test
    void withoutColourTwentyFourStylesAndThePickStillDiffer() {
        boolean[][] patterns = new boolean[25][];
        for (int style = 0; style < 25; style++) {
            patterns[style] = pattern(style % 24, style == 24, Palette.light());
        }
        for (int one = 0; one < 25; one++) {
            for (int other = 0; other < one; other++) {
                int different = 0;
                for (int i = 0; i < WIDE * HIGH; i++) {
                    different += patterns[one][i] == patterns[other][i] ? 0 : 1;
                }
                assertTrue(different >= 12, "styles " + one + " and " + other + " differ in " + different + " pixels only");
            }
        }
    }

    @Test
    void aSwatchLeavesTheGcAsItWas() {
        Image image = new Image(Display.getDefault(), WIDE, HIGH);
        GC gc = new GC(image);
        gc.setForeground(Palette.light().outside());
        gc.setLineWidth(3);
        CurveStyle.paintSwatch(gc, new Rectangle(0, 0, WIDE, HIGH), 2, false, Palette.light());
        assertEquals(Palette.light().outside(), gc.getForeground());
        assertEquals(3, gc.getLineWidth());
        assertEquals(new RGB(255, 255, 255), gc.getBackground().getRGB());
        gc.dispose();
        image.dispose();
    }
}
