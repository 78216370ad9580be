package stirwright.chart;

/**
 * One curve. The arrays are taken as they are, without a copy, and must not change while the curve is shown.
 *
 * @param id what the caller knows it by
 * @param label its name on the chart
 * @param x ascending, in values of the x axis
 * @param y as many, in values of the y axis. What is not a number, not finite or not positive on a logarithmic axis is a gap
 * @param inside as many: false where the curve is shown beyond what its source stands behind
 * @param style see {@link CurveStyle}
 * @param pick true for the one that the user relies on
 */
public record Curve(String id, String label, double[] x, double[] y, boolean[] inside, int style, boolean pick) {
    /** @throws IllegalArgumentException when the arrays differ in length or the style is negative */
    public Curve {
        if (x.length != y.length || x.length != inside.length) {
            throw new IllegalArgumentException("curve " + id + ": " + x.length + " x, " + y.length + " y and "
                    + inside.length + " inside; give as many of each");
        }
        if (style < 0) {
            throw new IllegalArgumentException("curve " + id + ": style " + style + " is negative");
        }
    }
}
