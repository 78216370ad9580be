package stirwright.console.internal;

import java.io.PrintWriter;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import stirwright.correlation.Figures;
import stirwright.exchange.CurveFits;
import stirwright.rheology.Fit;
import stirwright.rheology.ModelKind;
import stirwright.rheology.Parameter;

/** Fitted fluid models laid out for reading. */
final class FitView {
    private final PrintWriter out;

    FitView(PrintWriter out) {
        this.out = out;
    }

    void print(List<CurveFits> fits) {
        StringBuilder text = new StringBuilder();
        for (CurveFits curve : fits) {
            Columns.appendWrapped(text, "", curve.curve().label() + ": " + curve.curve().points().size()
                    + " points, shear rate " + Figures.show(curve.curve().points().window().min()) + " to "
                    + Figures.show(curve.curve().points().window().max()) + " 1/s", CaseView.WIDTH);
            for (CurveFits.Attempt attempt : curve.attempts()) {
                attempt.fit().ifPresent(fit -> Columns.appendWrapped(
                        text, "  ", attempt.rank() + ". " + words(attempt.model(), fit), CaseView.WIDTH));
                attempt.notes().forEach(n -> Columns.appendWrapped(
                        text, "    ", attempt.model().id() + ": " + n, CaseView.WIDTH));
            }
            text.append('\n');
        }
        out.print(text);
        out.flush();
    }

    private static String words(ModelKind model, Fit fit) {
        double[] values = ModelKind.values(fit.model());
        List<String> parameters = new ArrayList<>();
        for (int i = 0; i < values.length; i++) {
            Parameter parameter = model.parameters().get(i);
            parameters.add(parameter.name().replace('_', ' ') + " " + Figures.show(values[i])
                    + (parameter.unit().equals("-") ? "" : " " + parameter.unit()));
        }
        return model.id() + ": " + String.join(", ", parameters)
                + String.format(Locale.ROOT, "; root mean square of the relative error %.2f %%", 100 * fit.rmsRelative());
    }
}
