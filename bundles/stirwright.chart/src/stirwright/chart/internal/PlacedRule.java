package stirwright.chart.internal;

import org.eclipse.swt.graphics.Rectangle;
import stirwright.chart.Rule;

/**
 * A named place on the x axis that is in view.
 *
 * @param x in pixels
 * @param words where its words stand
 */
record PlacedRule(Rule rule, int x, Rectangle words) { }
