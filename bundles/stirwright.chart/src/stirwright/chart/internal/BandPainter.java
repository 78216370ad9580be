package stirwright.chart.internal;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Rectangle;
import stirwright.chart.Band;
import stirwright.chart.Palette;

/** Paints the vertical bands: every other one is tinted, so that neighbours differ, and each has its words above the plot. */
final class BandPainter {
    private static final int AIR = 4;

    private BandPainter() { }

    static void tint(GC gc, Scene scene, Palette palette) {
        gc.setBackground(palette.quiet());
        gc.setAlpha(Strokes.BAND_ALPHA);
        for (int i = 0; i < scene.picture.bands().size(); i += 2) {
            Band band = scene.picture.bands().get(i);
            int left = left(scene, band);
            int right = right(scene, band);
            if (right > left) {
                gc.fillRectangle(left, scene.plot.y, right - left, scene.plot.height);
            }
        }
        gc.setAlpha(255);
    }

    static void words(GC gc, Scene scene, Palette palette) {
        gc.setForeground(palette.quiet());
        for (Band band : scene.picture.bands()) {
            int left = left(scene, band);
            int room = right(scene, band) - left;
            String words = room < 2 * AIR ? "" : Lettering.fit(gc, band.words(), room - 2 * AIR);
            if (!words.isEmpty()) {
                gc.drawText(words, left + (room - Lettering.width(gc, words)) / 2, scene.plot.y - AIR - scene.type.height(), SWT.DRAW_TRANSPARENT);
            }
        }
    }

    /** Notes the words of a band that is too narrow for them. */
    static void hint(GC gc, Scene scene, Band band) {
        int left = left(scene, band);
        int room = right(scene, band) - left;
        if (room > 0) {
            scene.hint(new Rectangle(left, scene.plot.y - AIR - scene.type.height(), room, scene.type.height()), band.words(),
                    Lettering.fit(gc, band.words(), room - 2 * AIR), "");
        }
    }

    private static int left(Scene scene, Band band) {
        double at = scene.x.pixel(band.from());
        return Double.isNaN(at) ? scene.plot.x : (int) Math.round(scene.x.clamp(at));
    }

    private static int right(Scene scene, Band band) {
        double at = scene.x.pixel(band.to());
        boolean nowhere = Double.isNaN(at) && !(band.to() > 0);
        return nowhere ? scene.plot.x : Double.isNaN(at) ? scene.plot.x + scene.plot.width : (int) Math.round(scene.x.clamp(at));
    }
}
