package stirwright.workbench.internal.flow;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import stirwright.rheology.FitOptions;
import stirwright.rheology.FlowCurve;
import stirwright.rheology.FluidModel;
import stirwright.rheology.MeasuredWindow;
import stirwright.rheology.ModelFit;
import stirwright.rheology.ModelKind;
import stirwright.rheology.Objective;
import stirwright.rheology.RankedFits;
import stirwright.rheology.TemperatureLaw;
import stirwright.rheology.YieldRange;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.session.ModelTitles;

/** Fits the models and puts together what the page shows. Remembers the last fits, since most edits change none. For one thread. */
final class FlowCalculation {
    /** Targets whose fits are kept, the newest: enough for every curve and group of a sheet of replicates. */
    private static final int KEPT = 40;
    /** The best so many are drawn from the start, our choice. */
    private static final int SHOWN = 3;

    private final Map<Key, Optional<RankedFits>> known = lastUsed();

    private final Map<Object, Optional<TemperatureLaw>> laws = lastUsed();

    /** The arrays are those of the study's curves and never change, so that they themselves are the key. */
    private record Key(List<List<Object>> arrays, FitOptions options) {
        static Key of(List<CurveData> curves, FitOptions options) {
            return new Key(curves.stream().map(c -> List.<Object>of(c.rates(), c.stresses())).toList(), options);
        }
    }

    /**
     * @param stale asked now and then; once it says yes, the work is given up
     * @throws CancellationException when it was given up
     */
    FlowSheet of(FlowRequest request, BooleanSupplier stale) {
        Optional<RankedFits> fits = request.target().flatMap(t -> fits(t.curves(), request.options(), stale));
        List<ModelRow> rows = rows(request, fits);
        MeasuredWindow window = fits.map(f -> f.curve().window()).orElse(MeasuredWindow.UNKNOWN);
        Ramps ramps = new Ramps(request, this, stale);
        String selected = selected(request, rows);
        Set<String> hidden = hidden(request, rows, selected);
        Optional<YieldRange> yield = ramps.yield(fits);
        return new FlowSheet(request.fluid(), request.curves(), request.targets(), request.target(), rows, selected, hidden, window,
                yield, fits.filter(f -> f.recommended().isPresent()).map(RankedFits::reason).map(ModelTitles::inWords).orElse(""),
                new FlowAbout(request, fits, window, ramps, yield, law(request, fits, stale)).sections(),
                FlowPicture.of(request, rows.stream().filter(r -> !hidden.contains(r.key())).toList(), selected, window));
    }

    /** The one asked for; else the one in use; else the first. */
    private static String selected(FlowRequest request, List<ModelRow> rows) {
        return rows.stream().filter(r -> r.key().equals(request.selected())).findFirst()
                .or(() -> rows.stream().filter(r -> r.pick() && r.fit().isPresent()).findFirst())
                .or(() -> rows.stream().findFirst()).map(ModelRow::key).orElse("");
    }

    /** What was switched off by hand; where nothing was switched, all but the best few, since eight curves hide their points. */
    private static Set<String> hidden(FlowRequest request, List<ModelRow> rows, String selected) {
        return rows.stream().filter(r -> !request.shown().getOrDefault(r.key(),
                r.rank() > 0 && r.rank() <= SHOWN || r.pick() || r.key().equals(selected)))
                .map(ModelRow::key).collect(Collectors.toSet());
    }

    private static <K, V> Map<K, V> lastUsed() {
        return new LinkedHashMap<>(16, 0.75f, true) {
            @Override
            protected boolean removeEldestEntry(Map.Entry<K, V> eldest) {
                return size() > KEPT;
            }
        };
    }

    /** Empty where too few points can be used. */
    Optional<RankedFits> fits(List<CurveData> curves, FitOptions options, BooleanSupplier stale) {
        Key key = Key.of(curves, options);
        Optional<RankedFits> fits = known.get(key);
        if (fits == null) {
            check(stale);
            fits = pooled(curves).map(c -> RankedFits.of(c, options));
            known.put(key, fits);
        }
        return fits;
    }

    /** Of the recommended model over the temperatures of the used curves whose ramps are those of the target. */
    private Optional<TemperatureLaw> law(FlowRequest request, Optional<RankedFits> fits, BooleanSupplier stale) {
        Set<String> ramps = request.target().stream().flatMap(t -> t.curves().stream()).map(CurveData::ramp).collect(Collectors.toSet());
        List<CurveData> curves = request.curves().stream()
                .filter(c -> c.used() && ramps.contains(c.ramp()) && !Double.isNaN(c.temperature())).toList();
        Optional<ModelKind> kind = fits.flatMap(RankedFits::recommended).map(ModelFit::kind);
        if (kind.isEmpty() || FitTarget.temperatures(curves).size() < 2) {
            return Optional.empty();
        }
        return laws.computeIfAbsent(List.of(kind.get(), Key.of(curves, request.options())), key -> {
            check(stale);
            return Laws.of(kind.get(), curves, request.options());
        });
    }

    private static void check(BooleanSupplier stale) {
        if (stale.getAsBoolean()) {
            throw new CancellationException();
        }
    }

    /** The points of all curves with rate and stress above 0; empty where they are too few. */
    static Optional<FlowCurve> pooled(List<CurveData> curves) {
        double[] rates = curves.stream().flatMapToDouble(c -> usable(c).mapToDouble(i -> c.rates()[i])).toArray();
        double[] stresses = curves.stream().flatMapToDouble(c -> usable(c).mapToDouble(i -> c.stresses()[i])).toArray();
        return rates.length < 3 ? Optional.empty() : Optional.of(FlowCurve.of(rates, stresses));
    }

    private static IntStream usable(CurveData curve) {
        return IntStream.range(0, curve.rates().length).filter(i -> curve.rates()[i] > 0 && curve.stresses()[i] > 0);
    }

    private static List<ModelRow> rows(FlowRequest request, Optional<RankedFits> fits) {
        List<ModelRow> rows = new ArrayList<>();
        fits.ifPresent(all -> all.attempts().forEach(a -> {
            Optional<ModelFit> fit = a.fit();
            rows.add(new ModelRow(a.kind().id(), ModelTitles.of(a.kind()), a.kind(), a.rank(), fit.map(ModelFit::model), fit,
                    fit.map(ModelFit::rmsRelative).orElse(Double.NaN), a.deltaAicc(), a.notes(), a.kind().ordinal(),
                    fit.filter(f -> same(f.model(), request.inUse())).isPresent(),
                    all.recommended().filter(r -> r.kind() == a.kind()).isPresent()));
        }));
        request.inUse().filter(m -> rows.stream().noneMatch(ModelRow::pick)).ifPresent(m -> rows.add(inUse(m, fits)));
        return rows;
    }

    private static boolean same(FluidModel fitted, Optional<FluidModel> inUse) {
        return inUse.filter(m -> ModelKind.of(m) == ModelKind.of(fitted)
                && Arrays.equals(ModelKind.values(m), ModelKind.values(FluidEdits.kept(fitted)))).isPresent();
    }

    /** The model of the study, typed by hand or picked from other points, beside those of these points. */
    private static ModelRow inUse(FluidModel model, Optional<RankedFits> fits) {
        ModelKind kind = ModelKind.of(model);
        double rms = fits.map(f -> Math.sqrt(Objective.RELATIVE.residualSumOfSquares(model, f.curve()) / f.curve().size())).orElse(Double.NaN);
        return new ModelRow(ModelRow.IN_USE, Messages.bind(FlowWords.Row_inUse, ModelTitles.of(kind)), kind, 0,
                Optional.of(model), Optional.empty(), rms, Double.NaN, List.of(FlowWords.Row_inUseNote), kind.ordinal(), true, false);
    }
}
