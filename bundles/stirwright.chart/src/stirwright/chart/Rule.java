package stirwright.chart;

/**
 * A place on the x axis with its name: a line across the plot with words beside it.
 *
 * @param x in values of the x axis
 * @param words what stands beside it, for instance "average at the impeller"
 * @param doubt what is doubtful about it, written below the words; the line is dashed then. Empty for nothing
 */
public record Rule(double x, String words, String doubt) { }
