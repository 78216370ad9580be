/** The chart view in a real window, judged by its pixels. */
package stirwright.chart;
