package stirwright.chart;

/**
 * The operating point.
 *
 * @param x in values of the x axis
 * @param y in values of the y axis
 * @param xWords what is written beside it for x, for instance "Re 1240"
 * @param yWords what is written beside it for y
 */
public record Mark(double x, double y, String xWords, String yWords) { }
