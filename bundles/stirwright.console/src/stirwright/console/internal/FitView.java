package stirwright.console.internal;

import java.io.PrintWriter;
import java.util.List;
import java.util.Locale;
import stirwright.correlation.Figures;
import stirwright.exchange.CurveFits;
import stirwright.exchange.SampleFits;
import stirwright.rheology.Estimate;
import stirwright.rheology.Interval;
import stirwright.rheology.ModelFit;
import stirwright.rheology.RankedFits;

/** Fitted fluid models laid out for reading. */
final class FitView {
    private final PrintWriter out;

    FitView(PrintWriter out) {
        this.out = out;
    }

    /** @param samples those of several curves are summed up below */
    void print(List<CurveFits> fits, List<SampleFits> samples) {
        StringBuilder text = new StringBuilder();
        for (CurveFits curve : fits) {
            append(text, curve);
            text.append('\n');
        }
        samples.forEach(sample -> SampleView.append(text, sample));
        out.print(text);
        out.flush();
    }

    private static void append(StringBuilder text, CurveFits fits) {
        Columns.appendWrapped(text, "", fits.curve().label() + ": " + fits.curve().points().size()
                + " points, shear rate " + Figures.show(fits.curve().points().window().min()) + " to "
                + Figures.show(fits.curve().points().window().max()) + " 1/s; " + fits.fits().options().words()
                + ", intervals of 95 %", CaseView.WIDTH);
        Columns.appendWrapped(text, "  ", fits.fits().reason(), CaseView.WIDTH);
        Columns table = new Columns("rllrlrl");
        for (RankedFits.Attempt attempt : fits.fits().attempts()) {
            attempt.fit().ifPresentOrElse(fit -> add(table, attempt, fit),
                    () -> table.add("", attempt.kind().id(), "", "", "", "", ""));
            attempt.notes().forEach(table::under);
        }
        table.appendTo(text, "  ", CaseView.WIDTH);
    }

    private static void add(Columns table, RankedFits.Attempt attempt, ModelFit fit) {
        String head = String.format(Locale.ROOT, "%.2f %%%s", 100 * fit.rmsRelative(),
                Double.isNaN(attempt.deltaAicc()) ? "" : String.format(Locale.ROOT, ", AICc +%.1f", attempt.deltaAicc()));
        for (int i = 0; i < fit.estimates().size(); i++) {
            Estimate estimate = fit.estimates().get(i);
            String unit = estimate.parameter().unit().equals("-") ? "" : estimate.parameter().unit();
            table.add(i == 0 ? attempt.rank() + "." : "", i == 0 ? attempt.kind().id() : i == 1 ? head : "",
                    estimate.parameter().title(), Figures.show(estimate.value()), unit, words(estimate.interval()), "");
        }
        if (fit.estimates().size() == 1) {
            table.add("", head, "", "", "", "", "");
        }
    }

    private static String words(Interval interval) {
        if (Double.isNaN(interval.low()) && Double.isNaN(interval.high())) {
            return "not given";
        }
        return end(interval.low()) + " to " + end(interval.high());
    }

    private static String end(double end) {
        return Double.isNaN(end) ? "?" : Figures.show(end);
    }
}
