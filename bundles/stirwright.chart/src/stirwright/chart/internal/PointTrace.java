package stirwright.chart.internal;

import java.util.Arrays;
import java.util.HashSet;
import java.util.Set;
import org.eclipse.swt.graphics.Rectangle;
import stirwright.chart.Points;

/**
 * Measured points made ready for painting: their places in view. Of many points that would cover one another one is painted,
 * so that a hundred thousand of them are as quick as what can be seen of them.
 */
final class PointTrace {
    /** Closer than these pixels two marks look like one. */
    private static final int CELL = 2;

    private final Points points;
    private final int[] px;
    private final int[] py;

    PointTrace(Points points, Scale x, Scale y, Rectangle plot) {
        this.points = points;
        int[] atX = new int[points.x().length];
        int[] atY = new int[points.x().length];
        Set<Long> taken = new HashSet<>();
        int count = 0;
        for (int i = 0; i < points.x().length; i++) {
            double left = x.pixel(points.x()[i]);
            double top = y.pixel(points.y()[i]);
            if (!Double.isNaN(left) && !Double.isNaN(top) && x.covers(left) && y.covers(top)) {
                atX[count] = (int) Math.round(left);
                atY[count] = (int) Math.round(top);
                long cell = (atX[count] - plot.x) / CELL * 100_000L + (atY[count] - plot.y) / CELL;
                count += taken.add(cell) ? 1 : 0;
            }
        }
        px = Arrays.copyOf(atX, count);
        py = Arrays.copyOf(atY, count);
    }

    Points points() {
        return points;
    }

    /** How many marks are painted. */
    int count() {
        return px.length;
    }

    int px(int i) {
        return px[i];
    }

    int py(int i) {
        return py[i];
    }
}
