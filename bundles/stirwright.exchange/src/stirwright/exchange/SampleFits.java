package stirwright.exchange;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
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
     * Groups fitted curves by sample, in the order of their first curve.
     *
     * @param staticYield Pa, as a vane measured it on all of them; empty when nobody did
     */
    public static List<SampleFits> of(List<CurveFits> fits, FitOptions options, OptionalDouble staticYield) {
        Map<List<String>, List<CurveFits>> samples = new LinkedHashMap<>();
        for (CurveFits one : fits) {
            Measurement from = one.curve().measurement();
            samples.computeIfAbsent(List.of(from.source(), from.sha256(), from.sample()), k -> new ArrayList<>()).add(one);
        }
        return samples.values().stream().map(curves -> sample(curves, options, staticYield)).toList();
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
            CurveFits together = replicates.size() == 1 ? replicates.get(0) : CurveFits.of(pool(replicates), options);
            if (replicates.size() > 1) {
                pooled.add(together);
            }
            whole.put(together.curve().label(), together.fits());
        }
        Optional<Hysteresis> loop = ramps.containsKey(Ramp.UP) && ramps.containsKey(Ramp.DOWN)
                ? Hysteresis.between(points(ramps.get(Ramp.UP)), points(ramps.get(Ramp.DOWN))) : Optional.empty();
        return new AtTemperature(celsius(alike.get(0)), alike, pooled, loop, YieldRange.of(whole, staticYield));
    }

    private static FlowCurve points(List<CurveFits> replicates) {
        return FlowCurve.pooled(replicates.stream().map(c -> c.curve().points()).toList());
    }

    private static MeasuredCurve pool(List<CurveFits> replicates) {
        MeasuredCurve first = replicates.get(0).curve();
        Measurement from = first.measurement();
        return new MeasuredCurve(first.label() + " and " + (replicates.size() - 1) + " more, pooled", points(replicates),
                new Measurement(from.source(), from.sha256(), "", from.sample(), from.ramp(), replicates.size(), from.temperature(),
                        List.of(), List.of()));
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
