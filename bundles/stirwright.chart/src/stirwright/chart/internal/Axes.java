package stirwright.chart.internal;

import org.eclipse.swtchart.Chart;
import org.eclipse.swtchart.IAxis;
import org.eclipse.swtchart.LineStyle;
import org.eclipse.swtchart.Range;

/** Keeps the axes of SWTChart in step with what is in view and silences what it would draw itself. */
final class Axes {
    private Axes() { }

    static void quiet(Chart chart) {
        chart.suspendUpdate(true);
        chart.getTitle().setVisible(false);
        chart.getLegend().setVisible(false);
        for (IAxis axis : chart.getAxisSet().getAxes()) {
            axis.getTitle().setVisible(false);
            axis.getTick().setVisible(false);
            axis.getGrid().setStyle(LineStyle.NONE);
            axis.setDrawAxisLine(false);
        }
    }

    static void follow(Chart chart, Span x, Span y) {
        follow(chart.getAxisSet().getXAxis(0), x);
        follow(chart.getAxisSet().getYAxis(0), y);
    }

    /** A logarithmic axis of SWTChart must be above zero before it is told that it is logarithmic. */
    private static void follow(IAxis axis, Span span) {
        if (axis.isLogScaleEnabled() && !span.log()) {
            axis.enableLogScale(false);
        }
        axis.setRange(new Range(span.least(), span.most()));
        if (span.log() && !axis.isLogScaleEnabled()) {
            axis.enableLogScale(true);
        }
    }
}
