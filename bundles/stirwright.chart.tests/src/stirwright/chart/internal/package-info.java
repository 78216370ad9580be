/** What the chart view computes before it paints. */
package stirwright.chart.internal;
