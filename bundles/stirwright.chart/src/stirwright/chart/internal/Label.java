package stirwright.chart.internal;

/**
 * A curve's name in the column at the right.
 *
 * @param trace the curve; null for the line that counts those without room
 * @param text as it fits
 * @param x left end of the text
 * @param y its middle
 */
public record Label(Trace trace, String text, int x, int y) { }
