package stirwright.cards.internal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import stirwright.conformance.Proof;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.Variable;

/** Finds what to draw of a correlation: a case that it was made for, and the variable that matters most. */
final class Plotting {
    private static final int POINTS = 240;
    private static final int HALVINGS = 30;

    /** A ring belongs on the curve when the row's own case gives what the curve has there. */
    private static final double SAME = 0.005;

    /** How far beyond the stated range the window reaches: a factor on a logarithmic axis, a share of the range on another. */
    private static final double BEYOND_FACTOR = 10;
    private static final double BEYOND_SHARE = 0.35;
    private static final double BEYOND_POINT = 0.5;

    private final Holdings holdings;
    private final Correlation card;

    private Plotting(Holdings holdings, Correlation card) {
        this.holdings = holdings;
        this.card = card;
    }

    /** Empty when there is no case to draw it for, or no number comes out. */
    static Optional<PlotData> of(Holdings holdings, Correlation card) {
        return new Plotting(holdings, card).find();
    }

    private Optional<PlotData> find() {
        Optional<PlotCase> found = base();
        if (found.isEmpty()) {
            return Optional.empty();
        }
        PlotCase base = found.get();
        Set<GeometryParameter> read = read(base);
        PlotData best = null;
        for (Sweep sweep : sweeps(base, read)) {
            PlotData data = draw(sweep, base, read);
            if (data.points().size() > 1 && (best == null || influence(data) > influence(best))) {
                best = data;
            }
        }
        return Optional.ofNullable(best);
    }

    /** The first reference row within all stated bounds; else any that is; else the family's standard impeller. */
    private Optional<PlotCase> base() {
        List<Proof.Row> rows = holdings.proof(card).map(Proof::rows).orElse(List.of());
        List<PlotCase> cases = new ArrayList<>(rows.stream().map(row -> PlotCase.of(card, row)).toList());
        if (cases.isEmpty()) {
            Stream<Family> families = card.families().isEmpty() ? holdings.families().stream()
                    : card.families().stream().flatMap(id -> holdings.family(id).stream());
            families.forEach(family -> {
                try {
                    PlotCase.standards(card, family).forEach(cases::add);
                } catch (RuntimeException | LinkageError none) {
                    // One that demands more than a diameter is refused, and the defaults are code of a contributor; another
                    // family may have a standard impeller to draw.
                }
            });
        }
        return cases.stream().filter(this::inside).findFirst().or(() -> cases.stream().findFirst());
    }

    private List<Sweep> sweeps(PlotCase base, Set<GeometryParameter> read) {
        for (Variable variable : card.reads().contains(Variable.REYNOLDS) ? List.of(Variable.REYNOLDS)
                : card.reads().contains(Variable.FLOW_INDEX) ? List.of(Variable.FLOW_INDEX) : card.reads()) {
            Optional<Sweep> sweep = Sweep.over(card, variable, base);
            if (sweep.isPresent()) {
                return List.of(sweep.get());
            }
        }
        List<Sweep> over = Sweep.over(card, read, base);
        return over.isEmpty() ? List.of(Sweep.reynolds(card)) : over;
    }

    /** How much the value changes within the stated range. */
    private static double influence(PlotData data) {
        double least = Double.POSITIVE_INFINITY;
        double most = Double.NEGATIVE_INFINITY;
        for (PlotData.Point point : data.points()) {
            if (point.inside()) {
                least = Math.min(least, point.y());
                most = Math.max(most, point.y());
            }
        }
        return most >= least && least > 0 ? most / least : 0;
    }

    private Set<GeometryParameter> read(PlotCase base) {
        Set<GeometryParameter> read = new LinkedHashSet<>();
        Geometry recorder = parameter -> {
            read.add(parameter);
            return base.get(parameter);
        };
        value(recorder, base);
        return read;
    }

    private PlotData draw(Sweep sweep, PlotCase base, Set<GeometryParameter> read) {
        double[] window = {sweep.least(), sweep.most()};
        List<PlotData.Point> all = points(sweep, base, window);
        List<PlotData.Point> inside = all.stream().filter(PlotData.Point::inside).toList();
        if (!inside.isEmpty() && !sweep.whole()) {
            double from = inside.get(0).x();
            double to = inside.get(inside.size() - 1).x();
            double beyond = to - from < from / BEYOND_FACTOR ? BEYOND_POINT * from : BEYOND_SHARE * (to - from);
            window[0] = Math.max(sweep.least(), sweep.logarithmic() ? from / BEYOND_FACTOR : from - beyond);
            window[1] = Math.min(sweep.most(), sweep.logarithmic() ? to * BEYOND_FACTOR : to + beyond);
        }
        return new PlotData(sweep, base, read, points(sweep, base, window), rings(sweep, base, window));
    }

    private List<PlotData.Point> points(Sweep sweep, PlotCase base, double[] window) {
        List<PlotData.Point> points = new ArrayList<>();
        PlotData.Point last = null;
        double own = sweep.read().applyAsDouble(base);
        // The base itself is one of the points, so that a narrow range around it is not stepped over.
        DoubleStream all = own >= window[0] && own <= window[1] ? DoubleStream.concat(values(sweep, window), DoubleStream.of(own))
                : values(sweep, window);
        for (double x : all.sorted().distinct().toArray()) {
            PlotData.Point point = point(sweep, base, x);
            if (last != null && last.inside() != point.inside() && !sweep.whole()) {
                points.addAll(border(sweep, base, last, point));
            }
            points.add(point);
            last = point;
        }
        return points.stream().filter(point -> Double.isFinite(point.y())).toList();
    }

    private static DoubleStream values(Sweep sweep, double[] window) {
        if (sweep.whole()) {
            return IntStream.rangeClosed((int) window[0], (int) window[1]).asDoubleStream();
        }
        return IntStream.rangeClosed(0, POINTS).mapToDouble(i -> {
            double share = (double) i / POINTS;
            return sweep.logarithmic() ? window[0] * Math.pow(window[1] / window[0], share)
                    : window[0] + share * (window[1] - window[0]);
        });
    }

    /** Where the stated range ends, between a point inside and one outside. */
    private List<PlotData.Point> border(Sweep sweep, PlotCase base, PlotData.Point left, PlotData.Point right) {
        PlotData.Point low = left;
        PlotData.Point high = right;
        for (int i = 0; i < HALVINGS; i++) {
            PlotData.Point middle = point(sweep, base, (low.x() + high.x()) / 2);
            if (middle.inside() == low.inside()) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return List.of(low, high);
    }

    private PlotData.Point point(Sweep sweep, PlotCase base, double x) {
        PlotCase moved = sweep.move().apply(base, x);
        return new PlotData.Point(x, value(moved, moved), inside(moved));
    }

    private List<PlotData.Ring> rings(Sweep sweep, PlotCase base, double[] window) {
        List<PlotData.Ring> rings = new ArrayList<>();
        for (Proof.Row row : holdings.proof(card).map(Proof::rows).orElse(List.of())) {
            double x = sweep.read().applyAsDouble(PlotCase.of(card, row));
            double here = point(sweep, base, x).y();
            if (x >= window[0] && x <= window[1] && Math.abs(row.computed() / here - 1) <= SAME) {
                rings.add(new PlotData.Ring(x, row.expected(), row.fromOutside()));
            }
        }
        // Where two lie on each other the one from outside is seen.
        rings.sort(Comparator.comparing(PlotData.Ring::fromOutside));
        return rings;
    }

    private double value(Geometry geometry, PlotCase state) {
        try {
            return card.appliesTo(geometry) ? card.bind(geometry).at(state) : Double.NaN;
        } catch (RuntimeException | LinkageError failure) {
            // Code of a contributor: the conformance suite says what it throws, a card does without the number.
            return Double.NaN;
        }
    }

    private boolean inside(PlotCase state) {
        try {
            return card.validity().stream().noneMatch(bound -> bound.verdict(state, state).fails());
        } catch (RuntimeException | LinkageError failure) {
            // Code of a contributor, too: what cannot be told to hold is drawn as not stated to hold.
            return false;
        }
    }
}
