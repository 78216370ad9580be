/** How the chart view is made; for nobody else. */
package stirwright.chart.internal;
