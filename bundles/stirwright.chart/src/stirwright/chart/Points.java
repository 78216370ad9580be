package stirwright.chart;

/**
 * Measured points, each a filled mark. The arrays are taken as they are, without a copy, and must not change while the
 * points are shown.
 *
 * @param id what the caller knows them by, not that of any curve
 * @param label their name
 * @param x in values of the x axis, in any order
 * @param y as many, in values of the y axis. What is not a number, not finite or not positive on a logarithmic axis is left out
 * @param style their mark, see {@link CurveStyle#paintMark}
 * @param used false for points that are shown but nothing rests on; they are lighter
 */
public record Points(String id, String label, double[] x, double[] y, int style, boolean used) {
    /** @throws IllegalArgumentException when the arrays differ in length or the style is negative */
    public Points {
        if (x.length != y.length) {
            throw new IllegalArgumentException("points " + id + ": " + x.length + " x and " + y.length + " y; give as many of each");
        }
        if (style < 0) {
            throw new IllegalArgumentException("points " + id + ": style " + style + " is negative");
        }
    }
}
