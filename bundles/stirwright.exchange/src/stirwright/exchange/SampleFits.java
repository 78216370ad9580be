package stirwright.exchange;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Stream;
import stirwright.exchange.internal.curves.SamePoints;
import stirwright.exchange.internal.curves.SourceTemperature;
import stirwright.rheology.FitOptions;
import stirwright.rheology.FlowCurve;
import stirwright.rheology.Hysteresis;
import stirwright.rheology.ModelFit;
import stirwright.rheology.ModelKind;
import stirwright.rheology.ParameterException;
import stirwright.rheology.RankedFits;
import stirwright.rheology.TemperatureLaw;
import stirwright.rheology.YieldRange;

/**
 * What the curves of one sample say together.
 *
 * @param name of the sample, with the source's where several were read; the source's alone where it has but one
 * @param temperatures in the order of their first curve
 * @param law the model that leads most curves over the temperatures; empty with one temperature
 */
public record SampleFits(String name, List<AtTemperature> temperatures, Optional<TemperatureLaw> law) {

    public SampleFits {
        temperatures = List.copyOf(temperatures);
    }

    /**
     * Curves of one sample at one temperature.
     *
     * @param celsius deg C; NaN when not known
     * @param curves each as it was measured
     * @param pooled the replicates of one ramp as one curve; empty without replicates
     * @param loop up against down; empty without both
     * @param yieldStress over models and ramps; empty when no model with a yield stress describes a curve
     */
    public record AtTemperature(double celsius, List<CurveFits> curves, List<CurveFits> pooled, Optional<Hysteresis> loop,
            Optional<YieldRange> yieldStress) {
        public AtTemperature {
            curves = List.copyOf(curves);
            pooled = List.copyOf(pooled);
        }
    }

    /**
     * Groups fitted curves by sample, in the order of their first curve. Sources are different samples, unless their names
     * differ by a temperature alone, for instance ketchup_20C.csv and ketchup_40C.csv.
     *
     * @param staticYield Pa, as a vane measured it on all of them; empty when nobody did
     */
    public static List<SampleFits> of(List<CurveFits> fits, FitOptions options, OptionalDouble staticYield) {
        Map<List<String>, List<CurveFits>> warm = new LinkedHashMap<>();
        Set<String> mixed = new HashSet<>();
        fits.forEach(one -> SourceTemperature.without(from(one)).ifPresentOrElse(
                name -> warm.computeIfAbsent(List.of(name, from(one).sample()), k -> new ArrayList<>()).add(one), () -> mixed.add(from(one).sha256())));
        // A source with other temperatures than its name's is a sample of its own.
        warm.values().removeIf(curves -> !apart(curves) || curves.stream().anyMatch(c -> mixed.contains(from(c).sha256())));
        Map<List<String>, List<CurveFits>> samples = new LinkedHashMap<>();
        for (CurveFits one : fits) {
            Measurement from = from(one);
            List<String> key = SourceTemperature.without(from).map(name -> List.of(name, from.sample()))
                    .filter(warm::containsKey).orElseGet(() -> List.of(from.source(), from.sha256(), from.sample()));
            samples.computeIfAbsent(key, k -> new ArrayList<>()).add(one);
        }
        return samples.values().stream().map(curves -> sample(curves, options, staticYield)).toList();
    }

    private static Measurement from(CurveFits one) {
        return one.curve().measurement();
    }

    /** Whether no two sources have the same temperature: nothing says that these are replicates. */
    private static boolean apart(List<CurveFits> curves) {
        return byTemperature(curves).stream().allMatch(alike -> alike.stream().map(c -> from(c).sha256()).distinct().count() == 1);
    }

    private static SampleFits sample(List<CurveFits> curves, FitOptions options, OptionalDouble staticYield) {
        Measurement first = curves.get(0).curve().measurement();
        List<AtTemperature> temperatures = byTemperature(curves).stream().map(alike -> at(alike, options, staticYield)).toList();
        return new SampleFits(first.sample().isEmpty() ? first.source() : first.source() + " " + first.sample(), temperatures,
                law(curves, options));
    }

    private static List<List<CurveFits>> byTemperature(List<CurveFits> curves) {
        List<List<CurveFits>> groups = new ArrayList<>();
        for (CurveFits one : curves) {
            groups.stream().filter(g -> Measurement.sameTemperature(celsius(g.get(0)), celsius(one))).findFirst()
                    .orElseGet(() -> {
                        groups.add(new ArrayList<>());
                        return groups.getLast();
                    }).add(one);
        }
        return groups;
    }

    private static double celsius(CurveFits one) {
        return one.curve().measurement().temperature();
    }

    private static AtTemperature at(List<CurveFits> alike, FitOptions options, OptionalDouble staticYield) {
        Map<Ramp, List<CurveFits>> ramps = new LinkedHashMap<>();
        alike.forEach(c -> ramps.computeIfAbsent(c.curve().measurement().ramp(), r -> new ArrayList<>()).add(c));
        List<CurveFits> pooled = new ArrayList<>();
        Map<String, RankedFits> whole = new LinkedHashMap<>();
        for (List<CurveFits> replicates : ramps.values()) {
            List<CurveFits> each = distinct(replicates);
            CurveFits together = each.size() == 1 ? each.get(0) : CurveFits.of(pool(each, replicates.size() - each.size()), options);
            if (each.size() > 1) {
                pooled.add(together);
            }
            whole.put(together.curve().label(), together.fits());
        }
        Optional<Hysteresis> loop = ramps.containsKey(Ramp.UP) && ramps.containsKey(Ramp.DOWN)
                ? Hysteresis.between(points(ramps.get(Ramp.UP)), points(ramps.get(Ramp.DOWN))) : Optional.empty();
        return new AtTemperature(celsius(alike.get(0)), alike, pooled, loop, YieldRange.of(whole, staticYield));
    }

    /** A curve that was read twice counts once. */
    private static List<CurveFits> distinct(List<CurveFits> curves) {
        Map<SamePoints, CurveFits> seen = new LinkedHashMap<>();
        curves.forEach(c -> seen.putIfAbsent(new SamePoints(c.curve().points()), c));
        return List.copyOf(seen.values());
    }

    private static FlowCurve points(List<CurveFits> replicates) {
        return FlowCurve.pooled(distinct(replicates).stream().map(c -> c.curve().points()).toList());
    }

    /** @param twice how many curves are left out since their points are those of another */
    private static MeasuredCurve pool(List<CurveFits> replicates, int twice) {
        MeasuredCurve first = replicates.get(0).curve();
        Measurement from = first.measurement();
        Set<String> warnings = new LinkedHashSet<>();
        List<DroppedPoint> dropped = new ArrayList<>();
        for (CurveFits one : replicates) {
            one.curve().measurement().warnings().forEach(w -> warnings.add("'" + one.curve().label() + "': " + w));
            dropped.addAll(one.curve().measurement().dropped());
        }
        if (twice > 0) {
            warnings.add(twice + (twice == 1 ? " curve is" : " curves are") + " left out: the same points are in the pool already");
        }
        return new MeasuredCurve(first.label() + " and " + (replicates.size() - 1) + " more, pooled", points(replicates),
                new Measurement(from.source(), from.sha256(), "", from.sample(), from.ramp(), replicates.size(), from.temperature(),
                        dropped, List.copyOf(warnings)));
    }

    /** Over one ramp alone, the rising one if there is one, since ramps are never averaged. */
    private static Optional<TemperatureLaw> law(List<CurveFits> curves, FitOptions options) {
        List<CurveFits> warm = curves.stream().filter(c -> !Double.isNaN(celsius(c))).toList();
        Optional<List<CurveFits>> ramp = Stream.of(Ramp.UP, Ramp.NONE, Ramp.DOWN)
                .map(r -> warm.stream().filter(c -> c.curve().measurement().ramp() == r).toList())
                .filter(of -> byTemperature(of).size() > 1).findFirst();
        if (ramp.isEmpty()) {
            return Optional.empty();
        }
        List<TemperatureLaw.Measured> measured = byTemperature(ramp.get()).stream()
                .map(alike -> new TemperatureLaw.Measured(alike.stream().mapToDouble(SampleFits::celsius).average().orElseThrow(),
                        points(alike))).toList();
        Map<ModelKind, Integer> leading = new LinkedHashMap<>();
        ramp.get().forEach(c -> c.fits().recommended().map(ModelFit::kind).ifPresent(k -> leading.merge(k, 1, Integer::sum)));
        return leading.entrySet().stream().max(Comparator.comparingInt(Map.Entry::getValue)).flatMap(most -> {
            try {
                return TemperatureLaw.of(most.getKey(), measured, options);
            } catch (ParameterException | IllegalArgumentException noLaw) {
                // The model that leads on most curves does not describe one of the others; each still has its own fit.
                return Optional.empty();
            }
        });
    }
}
