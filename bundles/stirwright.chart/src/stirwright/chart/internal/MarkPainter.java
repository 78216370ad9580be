package stirwright.chart.internal;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import stirwright.chart.Mark;
import stirwright.chart.Palette;

/** Paints the operating point: a hollow ring with a hairline to both axes and its values beside it. */
final class MarkPainter {
    private static final int RADIUS = 5;
    private static final int AIR = 10;
    private static final int PICK_WEIGHT = 5;

    private MarkPainter() { }

    /** In pixels; null when it is not in view. */
    static Point at(Scene scene, Mark mark) {
        double x = scene.x.pixel(mark.x());
        double y = scene.y.pixel(mark.y());
        return scene.x.covers(x) && scene.y.covers(y) ? new Point((int) Math.round(x), (int) Math.round(y)) : null;
    }

    static void paint(GC gc, Scene scene, Palette palette) {
        Point at = scene.mark;
        gc.setLineWidth(1);
        gc.setForeground(palette.text());
        gc.setAlpha(150);
        gc.drawLine(at.x, at.y + RADIUS + 1, at.x, scene.plot.y + scene.plot.height);
        gc.drawLine(scene.plot.x, at.y, at.x - RADIUS - 1, at.y);
        gc.setAlpha(255);
        gc.setLineWidth(2);
        gc.drawOval(at.x - RADIUS, at.y - RADIUS, 2 * RADIUS, 2 * RADIUS);
        gc.setLineWidth(1);
        scene.picture.operatingPoint().ifPresent(mark -> words(gc, scene, palette, mark));
    }

    private static void words(GC gc, Scene scene, Palette palette, Mark mark) {
        Rectangle place = scene.markWords;
        gc.setBackground(palette.page());
        gc.setAlpha(205);
        gc.fillRoundRectangle(place.x, place.y, place.width, place.height, 6, 6);
        gc.setAlpha(255);
        gc.setForeground(palette.text());
        gc.drawText(mark.xWords(), place.x + 4, place.y + 2, SWT.DRAW_TRANSPARENT);
        gc.drawText(mark.yWords(), place.x + 4, place.y + 2 + scene.type.height(), SWT.DRAW_TRANSPARENT);
    }

    /** Of the four corners about the ring, each also a little further out, the first that covers least of the curves, the pick counting more. */
    static Rectangle place(GC gc, Scene scene, Mark mark) {
        Point at = scene.mark;
        int width = Math.max(Lettering.width(gc, mark.xWords()), Lettering.width(gc, mark.yWords())) + 8;
        int height = 2 * scene.type.height() + 4;
        Rectangle best = null;
        int least = Integer.MAX_VALUE;
        for (int i = 0; i < 12; i++) {
            int out = AIR + i / 4 * AIR * 2;
            int x = i % 2 == 0 ? at.x + out : at.x - out - width;
            int y = i / 2 % 2 == 0 ? at.y - out - height : at.y + out;
            Rectangle tried = new Rectangle(x, y, width, height);
            int covered = scene.plot.intersection(tried).equals(tried) ? covered(scene, tried) : Integer.MAX_VALUE - 1;
            if (covered < least) {
                least = covered;
                best = tried;
            }
        }
        return best;
    }

    private static int covered(Scene scene, Rectangle area) {
        int count = 0;
        for (Trace trace : scene.traces) {
            for (int i = 0; i < trace.count(); i++) {
                if (trace.stands(i) && area.contains((int) trace.px(i), (int) trace.py(i))) {
                    count += trace.curve().pick() ? PICK_WEIGHT : 1;
                }
            }
        }
        return count;
    }
}
