package stirwright.chart;

/**
 * How far a curve is known: what lies between two courses, tinted in the curve's colour and hidden with it. The arrays are
 * taken as they are, without a copy, and must not change while it is shown.
 *
 * @param curveId of the curve that it belongs to
 * @param x ascending, in values of the x axis
 * @param low as many, the lower course in values of the y axis; where either course has no place on the axis there is a gap
 * @param high as many, the upper course
 */
public record Envelope(String curveId, double[] x, double[] low, double[] high) {
    /** @throws IllegalArgumentException when the arrays differ in length */
    public Envelope {
        if (x.length != low.length || x.length != high.length) {
            throw new IllegalArgumentException("envelope of " + curveId + ": " + x.length + " x, " + low.length + " low and "
                    + high.length + " high; give as many of each");
        }
    }
}
