package stirwright.exchange.internal.write;

import static stirwright.exchange.internal.write.Column.count;
import static stirwright.exchange.internal.write.Column.number;
import static stirwright.exchange.internal.write.Column.text;
import static stirwright.exchange.internal.write.Column.words;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import stirwright.core.Status;
import stirwright.exchange.CurveFits;
import stirwright.rheology.Fit;
import stirwright.rheology.ModelKind;
import stirwright.rheology.Parameter;

/** The columns of the fit table: one row a curve, model and parameter. */
public final class FitColumns {

    /** A parameter's value; no parameter when the model could not be fitted. */
    public record Row(CurveFits curve, CurveFits.Attempt attempt, Optional<Parameter> parameter, double value) {}

    public static final List<Column<Row>> ALL = List.of(
            text("curve", r -> r.curve().curve().label()),
            text("model", r -> r.attempt().model().id()),
            count("rank", r -> r.attempt().fit().isPresent() ? r.attempt().rank() : -1),
            text("parameter", r -> r.parameter().map(Parameter::name).orElse("")),
            text("unit", r -> r.parameter().map(Parameter::unit).orElse("")),
            number("value", Row::value),
            number("low95", r -> Double.NaN),
            number("high95", r -> Double.NaN),
            number("rms_relative", r -> r.attempt().fit().map(Fit::rmsRelative).orElse(Double.NaN)),
            number("aicc", r -> Double.NaN),
            count("points", r -> r.curve().curve().points().size()),
            number("rate_min_1_s", r -> r.curve().curve().points().window().min()),
            number("rate_max_1_s", r -> r.curve().curve().points().window().max()),
            text("status", r -> (r.attempt().fit().isPresent() ? Status.OK : Status.REFUSED).id()),
            words("notes", r -> r.attempt().notes()));

    private FitColumns() {}

    public static List<Row> rows(CurveFits fits) {
        List<Row> rows = new ArrayList<>();
        for (CurveFits.Attempt attempt : fits.attempts()) {
            if (attempt.fit().isEmpty()) {
                rows.add(new Row(fits, attempt, Optional.empty(), Double.NaN));
                continue;
            }
            double[] values = ModelKind.values(attempt.fit().get().model());
            List<Parameter> parameters = attempt.model().parameters();
            for (int i = 0; i < values.length; i++) {
                rows.add(new Row(fits, attempt, Optional.of(parameters.get(i)), values[i]));
            }
        }
        return rows;
    }
}
