package stirwright.workbench.internal.flow;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import stirwright.chart.Axis;
import stirwright.chart.Band;
import stirwright.chart.Curve;
import stirwright.chart.Envelope;
import stirwright.chart.Picture;
import stirwright.chart.Points;
import stirwright.chart.Rule;
import stirwright.rheology.FluidModel;
import stirwright.rheology.Interval;
import stirwright.rheology.MeasuredWindow;
import stirwright.rheology.ModelFit;
import stirwright.workbench.internal.Messages;

/** Measured points, models and the shear rates of the case over the shear rate. */
final class FlowPicture {
    private static final int POINTS = 160;
    /** How far beyond measured and used shear rates the chart reaches, our choice. */
    private static final double REACH = 3;
    /** Room above and below what is shown, our choice. */
    private static final double ROOM = 1.6;

    private final FlowRequest request;
    private final List<ModelRow> rows;
    private final String selected;
    private final MeasuredWindow window;
    private final double least;
    private final double most;

    private FlowPicture(FlowRequest request, List<ModelRow> rows, String selected, MeasuredWindow window) {
        this.request = request;
        this.selected = selected;
        this.rows = rows;
        this.window = window;
        double[] shown = DoubleStream.concat(request.rates().stream().mapToDouble(NamedRate::rate),
                request.curves().stream().flatMapToDouble(c -> DoubleStream.of(c.rates())).filter(r -> r > 0)).toArray();
        least = DoubleStream.of(shown).min().orElse(1) / REACH;
        most = DoubleStream.of(shown).max().orElse(1) * REACH;
    }

    /**
     * @param shown the rows that are drawn, in the order of the table
     * @param selected the key of the one whose band and residuals are shown
     */
    static Picture of(FlowRequest request, List<ModelRow> shown, String selected, MeasuredWindow window) {
        FlowPicture picture = new FlowPicture(request, shown, selected, window);
        return request.view() == FlowView.RESIDUALS ? picture.residuals() : picture.courses();
    }

    private Picture courses() {
        double[] x = logarithmic();
        List<Curve> curves = new ArrayList<>();
        List<Envelope> envelopes = new ArrayList<>();
        for (ModelRow row : rows) {
            row.model().ifPresent(model -> curves.add(curve(row, model, x)));
            row.fit().filter(f -> row.pick() || row.key().equals(selected)).ifPresent(f -> envelopes.add(envelope(row, f, x)));
        }
        List<Points> points = request.curves().stream().map(this::points).toList();
        boolean stress = request.view() == FlowView.STRESS;
        return new Picture(axis(), span(points, curves).axis(stress ? FlowWords.Axis_stress : FlowWords.Axis_viscosity,
                stress ? "Pa" : "Pa s"), curves, measured(), Optional.empty(), points, envelopes, rules(), "");
    }

    private Curve curve(ModelRow row, FluidModel model, double[] x) {
        boolean[] inside = new boolean[x.length];
        double[] y = new double[x.length];
        for (int i = 0; i < x.length; i++) {
            y[i] = request.view().drawn(x[i], model.stress(x[i]));
            inside[i] = window.known() && window.contains(x[i]);
        }
        return new Curve(row.key(), row.title(), x, y, inside, row.style(), row.pick());
    }

    private Envelope envelope(ModelRow row, ModelFit fit, double[] x) {
        double[] low = new double[x.length];
        double[] high = new double[x.length];
        for (int i = 0; i < x.length; i++) {
            Interval band = fit.band(x[i]);
            low[i] = request.view().drawn(x[i], band.low());
            high[i] = request.view().drawn(x[i], band.high());
        }
        return new Envelope(row.key(), x, low, high);
    }

    private Points points(CurveData curve) {
        double[] y = IntStream.range(0, curve.rates().length)
                .mapToDouble(i -> request.view().drawn(curve.rates()[i], curve.stresses()[i])).toArray();
        return new Points("points " + curve.label(), curve.label(), curve.rates(), y, curve.style(), inTarget(curve));
    }

    private boolean inTarget(CurveData curve) {
        return request.target().isPresent() && request.target().get().curves().contains(curve);
    }

    /** The logarithm of measured over fitted stress of the selected model; nothing where it is not fitted. */
    private Picture residuals() {
        ModelRow row = rows.stream().filter(r -> r.key().equals(selected) && r.model().isPresent()).findFirst()
                .or(() -> rows.stream().filter(r -> r.model().isPresent()).findFirst()).orElse(null);
        if (row == null || request.target().isEmpty()) {
            return Picture.empty(FlowWords.Residuals_none);
        }
        List<Points> points = request.target().get().curves().stream().map(c -> residuals(c, row.model().get())).toList();
        double size = points.stream().flatMapToDouble(p -> DoubleStream.of(p.y())).map(Math::abs).filter(Double::isFinite).max().orElse(0.1);
        double[] x = logarithmic();
        boolean[] inside = new boolean[x.length];
        for (int i = 0; i < x.length; i++) {
            inside[i] = window.known() && window.contains(x[i]);
        }
        Curve zero = new Curve(row.key(), row.title(), x, new double[x.length], inside, row.style(), row.pick());
        double reach = Math.max(0.01, ROOM * size);
        return new Picture(axis(), new Axis(FlowWords.Axis_residual, "", false, -reach, reach), List.of(zero), measured(), Optional.empty(),
                points, List.of(), rules(), "");
    }

    private Points residuals(CurveData curve, FluidModel model) {
        double[] y = IntStream.range(0, curve.rates().length).mapToDouble(i -> curve.rates()[i] > 0 && curve.stresses()[i] > 0
                ? Math.log(curve.stresses()[i] / model.stress(curve.rates()[i])) : Double.NaN).toArray();
        return new Points("points " + curve.label(), curve.label(), curve.rates(), y, curve.style(), true);
    }

    private Axis axis() {
        return new Axis(FlowWords.Axis_rate, "1/s", true, least, most);
    }

    private List<Band> measured() {
        return window.known() ? List.of(new Band(FlowWords.Band_measured, window.min(), window.max())) : List.of();
    }

    private List<Rule> rules() {
        return request.rates().stream().map(r -> new Rule(r.rate(), r.name(), beyond(r, window))).toList();
    }

    /** By how many decades a rate lies outside what was measured, in words; empty inside, and where nothing was measured. */
    static String beyond(NamedRate rate, MeasuredWindow window) {
        double decades = window.known() ? window.decadesOutside(rate.rate()) : 0;
        return decades == 0 ? "" : Messages.bind(rate.rate() < window.min() ? FlowWords.Rate_below : FlowWords.Rate_above,
                String.format(Locale.ROOT, "%.1f", Math.max(0.1, decades)));
    }

    private double[] logarithmic() {
        double span = Math.log(most / least);
        return IntStream.range(0, POINTS).mapToDouble(i -> least * Math.exp(span * i / (POINTS - 1))).toArray();
    }

    /** What the vertical axis shows: the points, and the models as far as the shear rates that matter. */
    private Span span(List<Points> points, List<Curve> curves) {
        double from = least * REACH * 0.999;
        double to = most / REACH * 1.001;
        DoubleStream ofPoints = points.stream().flatMapToDouble(p -> DoubleStream.of(p.y()));
        DoubleStream ofCurves = curves.stream().filter(c -> c.pick() || points.isEmpty() || c.id().equals(selected))
                .flatMapToDouble(c -> IntStream.range(0, c.x().length).filter(i -> c.x()[i] >= from && c.x()[i] <= to).mapToDouble(i -> c.y()[i]));
        double[] all = DoubleStream.concat(ofPoints, ofCurves).filter(v -> v > 0 && Double.isFinite(v)).toArray();
        return new Span(DoubleStream.of(all).min().orElse(1) / ROOM, DoubleStream.of(all).max().orElse(1) * ROOM);
    }

    private record Span(double least, double most) {
        Axis axis(String title, String unit) {
            return new Axis(title, unit, true, least, most);
        }
    }
}
