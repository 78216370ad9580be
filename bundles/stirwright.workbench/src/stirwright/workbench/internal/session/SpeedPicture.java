package stirwright.workbench.internal.session;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.BooleanSupplier;
import stirwright.chart.Axis;
import stirwright.chart.Curve;
import stirwright.chart.Mark;
import stirwright.chart.Picture;
import stirwright.core.CandidateResult;
import stirwright.core.Catalogue;
import stirwright.core.CrossCheck;
import stirwright.core.SpeedDemand;
import stirwright.correlation.Figures;
import stirwright.workbench.internal.Messages;

/**
 * Power or torque over the speed: at each speed the whole case is computed anew, shear rate and viscosity included, so
 * every point is what the table would say there.
 */
final class SpeedPicture {
    private static final int POINTS = 48;

    /** How far beyond the case's speed the chart reaches, our choice. */
    private static final double REACH = 2;

    private static final double MINUTE = 60;

    private final Catalogue catalogue;
    private final View view;
    private final double[] speeds = new double[POINTS];
    private final CrossCheck crossCheck;
    private final BooleanSupplier stale;

    /** What one candidate has at each speed. */
    private static final class Line {
        private final double[] y = new double[POINTS];
        private final boolean[] inside = new boolean[POINTS];
        private final HomeRegime home;

        Line(HomeRegime home) {
            this.home = home;
            Arrays.fill(y, Double.NaN);
        }
    }

    private SpeedPicture(Catalogue catalogue, View view, double most, BooleanSupplier stale) {
        this.catalogue = catalogue;
        this.view = view;
        this.crossCheck = new CrossCheck(catalogue).withoutQuantities();
        this.stale = stale;
        Arrays.setAll(speeds, i -> most * (i + 1) / POINTS);
    }

    static Picture of(Catalogue catalogue, View view, List<Sheet> sheets, List<Row> rows, BooleanSupplier stale) {
        Row pick = rows.get(0);
        SpeedPicture picture = new SpeedPicture(catalogue, view, REACH * pick.speed(), stale);
        List<Curve> curves = picture.curves(sheets, rows);
        boolean power = view == View.POWER;
        String unit = power ? "W" : "N m";
        double value = power ? pick.power() : pick.torque();
        return new Picture(
                new Axis(Messages.Axis_speed, "rev/min", false, 0, MINUTE * REACH * pick.speed()),
                Range.fromZero(curves).axis(power ? Messages.Axis_power : Messages.Axis_torque, unit, false),
                curves, List.of(),
                Optional.of(new Mark(MINUTE * pick.speed(), value, Figures.show(MINUTE * pick.speed()) + " rev/min",
                        Figures.show(value) + " " + unit)), "");
    }

    private List<Curve> curves(List<Sheet> sheets, List<Row> rows) {
        Map<String, Line> lines = new HashMap<>();
        for (Sheet sheet : sheets) {
            rows.stream().filter(row -> row.familyId().equals(sheet.familyId()))
                    .forEach(row -> lines.put(row.key(), new Line(HomeRegime.of(catalogue, sheet, row))));
            sweep(sheet, lines);
        }
        double[] x = Arrays.stream(speeds).map(s -> MINUTE * s).toArray();
        List<Curve> curves = new ArrayList<>();
        for (Row row : rows) {
            Line line = lines.get(row.key());
            curves.add(new Curve(row.key(), Labels.of(row, sheets.size() > 1), x, line.y, line.inside, row.style(), row.pick()));
        }
        return curves;
    }

    private void sweep(Sheet sheet, Map<String, Line> lines) {
        sheet.spec().ifPresent(spec -> {
            for (int i = 0; i < POINTS; i++) {
                Stale.check(stale);
                for (CandidateResult result : crossCheck.check(spec.with(new SpeedDemand.At(speeds[i]))).candidates()) {
                    Line line = lines.get(Row.key(sheet.familyId(), result.correlation()));
                    if (line != null) {
                        line.y[i] = view == View.POWER ? result.power() : result.torque();
                        line.inside[i] = !result.verdict().fails()
                                && result.state().filter(s -> line.home.covers(s.reynolds())).isPresent();
                    }
                }
            }
        });
    }
}
