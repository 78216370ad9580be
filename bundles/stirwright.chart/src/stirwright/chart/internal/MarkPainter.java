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

    private MarkPainter() { }

    static void paint(GC gc, Scene scene, Palette palette, Mark mark) {
        double atX = scene.x.pixel(mark.x());
        double atY = scene.y.pixel(mark.y());
        if (!scene.x.covers(atX) || !scene.y.covers(atY)) {
            return;
        }
        int x = (int) Math.round(atX);
        int y = (int) Math.round(atY);
        gc.setLineWidth(1);
        gc.setForeground(palette.text());
        gc.setAlpha(150);
        gc.drawLine(x, y + RADIUS + 1, x, scene.plot.y + scene.plot.height);
        gc.drawLine(scene.plot.x, y, x - RADIUS - 1, y);
        gc.setAlpha(255);
        gc.setLineWidth(2);
        gc.drawOval(x - RADIUS, y - RADIUS, 2 * RADIUS, 2 * RADIUS);
        gc.setLineWidth(1);
        words(gc, scene, palette, mark, new Point(x, y));
    }

    private static void words(GC gc, Scene scene, Palette palette, Mark mark, Point at) {
        int height = scene.type.height();
        int width = Math.max(Lettering.width(gc, mark.xWords()), Lettering.width(gc, mark.yWords())) + 8;
        Rectangle best = place(scene, at, new Point(width, 2 * height + 4));
        gc.setBackground(palette.page());
        gc.setAlpha(205);
        gc.fillRoundRectangle(best.x, best.y, best.width, best.height, 6, 6);
        gc.setAlpha(255);
        gc.setForeground(palette.text());
        gc.drawText(mark.xWords(), best.x + 4, best.y + 2, SWT.DRAW_TRANSPARENT);
        gc.drawText(mark.yWords(), best.x + 4, best.y + 2 + height, SWT.DRAW_TRANSPARENT);
    }

    /** Of the four corners about the ring, each also a little further out, the first that covers fewest points of curves. */
    static Rectangle place(Scene scene, Point at, Point size) {
        Rectangle best = null;
        int least = Integer.MAX_VALUE;
        for (int i = 0; i < 12; i++) {
            int out = AIR + i / 4 * AIR * 2;
            int x = i % 2 == 0 ? at.x + out : at.x - out - size.x;
            int y = i / 2 % 2 == 0 ? at.y - out - size.y : at.y + out;
            Rectangle tried = new Rectangle(x, y, size.x, size.y);
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
                    count++;
                }
            }
        }
        return count;
    }
}
