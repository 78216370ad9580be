package stirwright.chart.internal;

import org.eclipse.swt.graphics.Device;
import org.eclipse.swt.graphics.Path;
import stirwright.chart.Curve;

/**
 * A curve made ready for painting: its course in pixels, cut to the plot, so that painting only strokes two paths. Made
 * anew when the zoom or the size changes.
 */
public final class Trace {
    private final Curve curve;
    private final float[] px;
    private final float[] py;
    private final Path inside;
    private final Path outside;
    private boolean anyInside;
    private boolean anyOutside;
    private double endX = Double.NaN;
    private double endY = Double.NaN;

    public Trace(Device device, Curve curve, Scale x, Scale y, Clip clip) {
        this.curve = curve;
        int count = curve.x().length;
        px = new float[count];
        py = new float[count];
        for (int i = 0; i < count; i++) {
            px[i] = (float) x.pixel(curve.x()[i]);
            py[i] = (float) y.pixel(curve.y()[i]);
        }
        inside = new Path(device);
        outside = new Path(device);
        draw(clip);
    }

    private void draw(Clip clip) {
        Path open = null;
        for (int i = 0; i + 1 < px.length; i++) {
            if (!stands(i) || !stands(i + 1) || !clip.cut(px[i], py[i], px[i + 1], py[i + 1])) {
                open = null;
                continue;
            }
            boolean within = curve.inside()[i] && curve.inside()[i + 1];
            Path path = within ? inside : outside;
            if (path != open || clip.x1 != px[i] || clip.y1 != py[i]) {
                path.moveTo((float) clip.x1, (float) clip.y1);
            }
            path.lineTo((float) clip.x2, (float) clip.y2);
            open = path;
            anyInside |= within;
            anyOutside |= !within;
            endX = clip.x2;
            endY = clip.y2;
        }
        for (int i = 0; i < px.length; i++) {
            if (alone(i) && clip.holds(px[i], py[i]) && !(endX >= px[i])) {
                endX = px[i];
                endY = py[i];
            }
        }
    }

    /** The curve. */
    public Curve curve() {
        return curve;
    }

    /** How many points it has, gaps included. */
    public int count() {
        return px.length;
    }

    /** In pixels; not a number in a gap. */
    public float px(int i) {
        return px[i];
    }

    /** In pixels; not a number in a gap. */
    public float py(int i) {
        return py[i];
    }

    /** Whether a point is not in a gap. */
    public boolean stands(int i) {
        return !Float.isNaN(px[i]) && !Float.isNaN(py[i]) && !Float.isInfinite(px[i]) && !Float.isInfinite(py[i]);
    }

    /** Whether a point has a gap on either side, so that no line shows it. */
    public boolean alone(int i) {
        return stands(i) && (i == 0 || !stands(i - 1)) && (i + 1 == px.length || !stands(i + 1));
    }

    /** The part within the curve's range; null when there is none in view. */
    public Path inside() {
        return anyInside ? inside : null;
    }

    /** The part outside it; null when there is none in view. */
    public Path outside() {
        return anyOutside ? outside : null;
    }

    /** Where the curve leaves the view; not a number when it is not in view. */
    public double endX() {
        return endX;
    }

    /** Where the curve leaves the view. */
    public double endY() {
        return endY;
    }

    /** The distance of a place from the drawn curve in pixels; infinite when nothing is drawn. */
    public double distance(double x, double y) {
        double least = Double.POSITIVE_INFINITY;
        for (int i = 0; i < px.length; i++) {
            if (stands(i)) {
                boolean line = i + 1 < px.length && stands(i + 1);
                double dx = line ? px[i + 1] - px[i] : 0;
                double dy = line ? py[i + 1] - py[i] : 0;
                double square = dx * dx + dy * dy;
                double part = square == 0 ? 0 : Math.clamp(((x - px[i]) * dx + (y - py[i]) * dy) / square, 0, 1);
                least = Math.min(least, Math.hypot(x - px[i] - part * dx, y - py[i] - part * dy));
            }
        }
        return least;
    }

    /** Gives the paths back to the system. */
    public void dispose() {
        inside.dispose();
        outside.dispose();
    }
}
