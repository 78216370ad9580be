package stirwright.exchange.internal.write;

import static stirwright.exchange.internal.write.Column.count;
import static stirwright.exchange.internal.write.Column.number;
import static stirwright.exchange.internal.write.Column.text;
import static stirwright.exchange.internal.write.Column.words;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;
import stirwright.exchange.CurveFits;
import stirwright.exchange.Measurement;
import stirwright.rheology.Estimate;
import stirwright.rheology.ModelFit;
import stirwright.rheology.RankedFits;

/** The columns of the fit table: one row a curve, model and parameter. */
public final class FitColumns {

    /** A parameter's estimate; none when the model could not be fitted. */
    public record Row(CurveFits curve, RankedFits.Attempt attempt, Optional<Estimate> estimate) {}

    public static final List<Column<Row>> ALL = List.of(
            text("curve", r -> r.curve().curve().label()),
            text("model", r -> r.attempt().kind().id()),
            count("rank", r -> r.attempt().fit().isPresent() ? r.attempt().rank() : -1),
            text("parameter", r -> r.estimate().map(e -> e.parameter().name()).orElse("")),
            text("unit", r -> r.estimate().map(e -> e.parameter().unit()).orElse("")),
            estimate("value", Estimate::value),
            estimate("low95", e -> e.interval().low()),
            estimate("high95", e -> e.interval().high()),
            fit("rms_relative", ModelFit::rmsRelative),
            fit("aicc", ModelFit::aicc),
            count("points", r -> r.curve().curve().points().size()),
            number("rate_min_1_s", r -> r.curve().curve().points().window().min()),
            number("rate_max_1_s", r -> r.curve().curve().points().window().max()),
            text("status", r -> CurveFits.status(r.attempt()).id()),
            words("notes", FitColumns::notes),
            number("aicc_above_best", r -> r.attempt().deltaAicc()),
            estimate("standard_error", Estimate::standardError),
            estimate("joint_low95", e -> e.joint().low()),
            estimate("joint_high95", e -> e.joint().high()),
            text("interval_by", r -> r.estimate().map(e -> e.method().name().toLowerCase(Locale.ROOT)).orElse("")),
            text("objective", r -> r.curve().fits().options().words()),
            text("ramp", r -> measurement(r).ramp().word()),
            count("replicate", r -> measurement(r).replicate()),
            number("temperature_C", r -> measurement(r).temperature()),
            count("dropped", r -> measurement(r).dropped().size()),
            text("source", r -> measurement(r).source()),
            text("sha256", r -> measurement(r).sha256()));

    private FitColumns() {}

    public static List<Row> rows(CurveFits fits) {
        List<Row> rows = new ArrayList<>();
        for (RankedFits.Attempt attempt : fits.fits().attempts()) {
            if (attempt.fit().isEmpty()) {
                rows.add(new Row(fits, attempt, Optional.empty()));
            }
            attempt.fit().ifPresent(fit -> fit.estimates().forEach(e -> rows.add(new Row(fits, attempt, Optional.of(e)))));
        }
        return rows;
    }

    private static List<String> notes(Row row) {
        Stream<String> curve = row.attempt().rank() == 1
                ? Stream.concat(Stream.of(row.curve().fits().reason()), measurement(row).warnings().stream()) : Stream.empty();
        return Stream.concat(curve, row.attempt().notes().stream()).toList();
    }

    private static Measurement measurement(Row row) {
        return row.curve().curve().measurement();
    }

    private static Column<Row> estimate(String name, ToDoubleFunction<Estimate> of) {
        return number(name, r -> r.estimate().map(of::applyAsDouble).orElse(Double.NaN));
    }

    private static Column<Row> fit(String name, ToDoubleFunction<ModelFit> of) {
        return number(name, r -> r.attempt().fit().map(of::applyAsDouble).orElse(Double.NaN));
    }
}
