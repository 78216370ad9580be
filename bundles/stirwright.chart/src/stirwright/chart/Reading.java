package stirwright.chart;

import java.util.List;

/**
 * What the curves say at one x.
 *
 * @param x in values of the x axis; not a number when there is no cursor
 * @param values the visible curves that have a value there, the highest first
 */
public record Reading(double x, List<At> values) {
    /**
     * One curve's value, interpolated between its neighbouring points along the straight line that is drawn: on a
     * logarithmic axis the interpolation is in the logarithm.
     *
     * @param curveId the curve's id
     * @param label its name
     * @param value in values of the y axis
     * @param inside false where one of the two neighbours is beyond what the curve's source stands behind
     */
    public record At(String curveId, String label, double value, boolean inside) { }

    /** Keeps a copy of the list. */
    public Reading {
        values = List.copyOf(values);
    }
}
