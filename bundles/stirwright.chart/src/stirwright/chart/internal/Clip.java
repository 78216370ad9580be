package stirwright.chart.internal;

/** Cuts straight lines to a rectangle, so that no painter is asked for a point a million pixels away. */
public final class Clip {
    private final double left;
    private final double top;
    private final double right;
    private final double bottom;
    /** The ends of the last line that was cut. */
    double x1;
    double y1;
    double x2;
    double y2;

    /** The rectangle in pixels. */
    public Clip(double left, double top, double right, double bottom) {
        this.left = left;
        this.top = top;
        this.right = right;
        this.bottom = bottom;
    }

    /** Whether a point is in the rectangle. */
    public boolean holds(double x, double y) {
        return x >= left && x <= right && y >= top && y <= bottom;
    }

    /** Cuts a line by the method of Liang and Barsky (1984); false when nothing is left, else the ends are kept. */
    public boolean cut(double fromX, double fromY, double toX, double toY) {
        double dx = toX - fromX;
        double dy = toY - fromY;
        double start = 0;
        double end = 1;
        for (int side = 0; side < 4; side++) {
            double towards = side == 0 ? -dx : side == 1 ? dx : side == 2 ? -dy : dy;
            double room = side == 0 ? fromX - left : side == 1 ? right - fromX : side == 2 ? fromY - top : bottom - fromY;
            if (towards == 0) {
                if (room < 0) {
                    return false;
                }
            } else if (towards < 0) {
                start = Math.max(start, room / towards);
            } else {
                end = Math.min(end, room / towards);
            }
        }
        if (start > end) {
            return false;
        }
        x1 = fromX + start * dx;
        y1 = fromY + start * dy;
        x2 = fromX + end * dx;
        y2 = fromY + end * dy;
        return true;
    }

    /** The end of the last cut line. */
    public double endX() {
        return x2;
    }

    /** The end of the last cut line. */
    public double endY() {
        return y2;
    }
}
