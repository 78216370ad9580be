package stirwright.workbench.internal.session;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.BooleanSupplier;
import stirwright.chart.Axis;
import stirwright.chart.Band;
import stirwright.chart.Curve;
import stirwright.chart.Mark;
import stirwright.chart.Picture;
import stirwright.core.Catalogue;
import stirwright.core.FluidState;
import stirwright.correlation.Figures;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Variable;
import stirwright.correlation.Verdict;
import stirwright.workbench.internal.Messages;

/** Every candidate of a quantity over one variable, everything else as at the pick of its family. */
final class SlicePicture {
    private static final int POINTS = 241;

    /** What the chart shows at least of the Reynolds number, our choice: both ends of what correlations speak of. */
    private static final double LEAST_REYNOLDS = 1;
    private static final double MOST_REYNOLDS = 1e5;

    /** The flow indices of the fluids met in vessels, our choice: from strongly thinning to thickening. */
    private static final double LEAST_INDEX = 0.1;
    private static final double MOST_INDEX = 1.6;

    private final Catalogue catalogue;
    private final View view;
    private final Variable over;
    private final double[] x;
    private final List<Sheet> sheets;
    private final BooleanSupplier stale;

    private SlicePicture(
            Catalogue catalogue, View view, Variable over, double[] x, List<Sheet> sheets, BooleanSupplier stale) {
        this.catalogue = catalogue;
        this.view = view;
        this.over = over;
        this.x = x;
        this.sheets = sheets;
        this.stale = stale;
    }

    static Picture overReynolds(
            Catalogue catalogue, View view, List<Sheet> sheets, List<Row> rows, BooleanSupplier stale) {
        double here = state(sheets.get(0)).map(FluidState::reynolds).orElse(LEAST_REYNOLDS);
        double least = Math.min(LEAST_REYNOLDS, decade(here / 2));
        double most = Math.max(MOST_REYNOLDS, 10 * decade(here * 2));
        SlicePicture picture = new SlicePicture(
                catalogue, view, Variable.REYNOLDS, logarithmic(least, most), sheets, stale);
        List<Curve> curves = picture.curves(rows);
        boolean power = view == View.POWER_NUMBER;
        return new Picture(
                new Axis(Messages.Axis_reynolds, "", true, least, most),
                Range.logarithmic(curves).axis(power ? Messages.Axis_powerNumber : Messages.Axis_flowNumber, "", true),
                curves, bands(catalogue, sheets.get(0), least, most),
                mark(rows.get(0), here, "Re", power ? "Np" : "Nq"), "");
    }

    static Picture overFlowIndex(
            Catalogue catalogue, View view, List<Sheet> sheets, List<Row> rows, BooleanSupplier stale) {
        double here = state(sheets.get(0)).map(FluidState::flowIndex).orElse(1.0);
        double most = Math.max(MOST_INDEX, Math.ceil(10 * here) / 10);
        double[] x = new double[POINTS];
        Arrays.setAll(x, i -> LEAST_INDEX + (most - LEAST_INDEX) * i / (POINTS - 1));
        List<Curve> curves = new SlicePicture(catalogue, view, Variable.FLOW_INDEX, x, sheets, stale).curves(rows);
        return new Picture(
                new Axis(Messages.Axis_flowIndex, "", false, LEAST_INDEX, most),
                Range.fromZero(curves).axis(Messages.Axis_shearRateConstant, Messages.Unit_perRevolution, false),
                curves, List.of(), mark(rows.get(0), here, "n", "ks"), "");
    }

    private List<Curve> curves(List<Row> rows) {
        List<Curve> curves = new ArrayList<>();
        for (Row row : rows) {
            Stale.check(stale);
            Sheet sheet = sheets.stream().filter(s -> s.familyId().equals(row.familyId())).findFirst().orElseThrow();
            curves.add(curve(row, sheet));
        }
        return curves;
    }

    private Curve curve(Row row, Sheet sheet) {
        double[] y = new double[x.length];
        Verdict[] verdicts = new Verdict[x.length];
        sheet.open().orElseThrow().slice(view.quantity(), row.correlationId(), over).evaluate(x, y, verdicts);
        boolean[] inside = new boolean[x.length];
        HomeRegime home = HomeRegime.of(catalogue, sheet, row);
        for (int i = 0; i < x.length; i++) {
            inside[i] = !verdicts[i].fails() && (over != Variable.REYNOLDS || home.covers(x[i]));
        }
        return new Curve(row.key(), Labels.of(row, sheets.size() > 1), x, y, inside, row.style(), row.pick());
    }

    private static Optional<FluidState> state(Sheet main) {
        return main.result().pick().flatMap(p -> p.state());
    }

    private static Optional<Mark> mark(Row pick, double x, String xSymbol, String ySymbol) {
        return pick.pick() && Double.isFinite(pick.value()) && Double.isFinite(x)
                ? Optional.of(new Mark(x, pick.value(), xSymbol + " " + Figures.show(x),
                        ySymbol + " " + Figures.show(pick.value())))
                : Optional.empty();
    }

    private static List<Band> bands(Catalogue catalogue, Sheet main, double least, double most) {
        RegimeLimits limits = HomeRegime.limits(catalogue, main);
        return List.of(new Band(Messages.Regime_laminar, least, limits.laminarUpTo()),
                new Band(Messages.Regime_transitional, limits.laminarUpTo(), limits.turbulentFrom()),
                new Band(Messages.Regime_turbulent, limits.turbulentFrom(), most));
    }

    private static double decade(double value) {
        return Math.pow(10, Math.floor(Math.log10(value)));
    }

    private static double[] logarithmic(double least, double most) {
        double[] x = new double[POINTS];
        double span = Math.log(most / least);
        Arrays.setAll(x, i -> least * Math.exp(span * i / (POINTS - 1)));
        return x;
    }
}
