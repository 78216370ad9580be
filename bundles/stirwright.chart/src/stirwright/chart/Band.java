package stirwright.chart;

/**
 * A faint vertical band, for instance a flow regime.
 *
 * @param words written at its top
 * @param from its left end in values of the x axis; may lie outside the axis or be infinite
 * @param to its right end
 */
public record Band(String words, double from, double to) { }
