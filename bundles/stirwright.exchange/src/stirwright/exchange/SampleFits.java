package stirwright.exchange;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
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
 * What the curves of one sample say: each by itself, replicates together, up against down, the range of the yield stress, and
 * a law over the temperatures.
 *
 * @param name of the sample; the source's name where it has but one
 * @param curves each as it was measured
 * @param pooled the replicates of one ramp and temperature as one curve; empty without replicates
 * @param loops up against down, for each temperature that has both
 * @param yieldStress over all curves and models; empty when no model with a yield stress describes one
 * @param law the model that leads most curves over the temperatures; empty with one temperature
 */
public record SampleFits(
        String name, List<CurveFits> curves, List<CurveFits> pooled, List<Loop> loops, Optional<YieldRange> yieldStress,
        Optional<TemperatureLaw> law) {

    /** In K; curves farther apart are measured at different temperatures on purpose. */
    private static final double SAME_TEMPERATURE = 2;

    public SampleFits {
        curves = List.copyOf(curves);
        pooled = List.copyOf(pooled);
        loops = List.copyOf(loops);
    }

    /**
     * Up against down.
     *
     * @param temperature in deg C; NaN when not known
     */
    public record Loop(double temperature, Hysteresis hysteresis) {}

    /** Groups fitted curves by sample, in the order of their first curve. */
    public static List<SampleFits> of(List<CurveFits> fits, FitOptions options) {
        Map<List<String>, List<CurveFits>> samples = new LinkedHashMap<>();
        for (CurveFits one : fits) {
            Measurement from = one.curve().measurement();
            samples.computeIfAbsent(List.of(from.source(), from.sha256(), from.sample()), k -> new ArrayList<>()).add(one);
        }
        return samples.values().stream().map(curves -> sample(curves, options)).toList();
    }

    private static SampleFits sample(List<CurveFits> curves, FitOptions options) {
        Measurement first = curves.get(0).curve().measurement();
        List<CurveFits> pooled = new ArrayList<>();
        List<Loop> loops = new ArrayList<>();
        for (List<CurveFits> alike : byTemperature(curves)) {
            Map<Ramp, List<CurveFits>> ramps = new LinkedHashMap<>();
            alike.forEach(c -> ramps.computeIfAbsent(c.curve().measurement().ramp(), r -> new ArrayList<>()).add(c));
            ramps.values().stream().filter(replicates -> replicates.size() > 1)
                    .forEach(replicates -> pooled.add(CurveFits.of(pool(replicates), options)));
            if (ramps.containsKey(Ramp.UP) && ramps.containsKey(Ramp.DOWN)) {
                Hysteresis.between(points(ramps.get(Ramp.UP)), points(ramps.get(Ramp.DOWN)))
                        .ifPresent(h -> loops.add(new Loop(alike.get(0).curve().measurement().temperature(), h)));
            }
        }
        Map<String, RankedFits> byLabel = new LinkedHashMap<>();
        curves.forEach(c -> byLabel.put(c.curve().label(), c.fits()));
        return new SampleFits(first.sample().isEmpty() ? first.source() : first.sample(), curves, pooled, loops,
                YieldRange.of(byLabel, OptionalDouble.empty()), law(curves, options));
    }

    private static List<List<CurveFits>> byTemperature(List<CurveFits> curves) {
        List<List<CurveFits>> groups = new ArrayList<>();
        for (CurveFits one : curves) {
            double temperature = one.curve().measurement().temperature();
            groups.stream().filter(g -> same(g.get(0).curve().measurement().temperature(), temperature)).findFirst()
                    .orElseGet(() -> {
                        groups.add(new ArrayList<>());
                        return groups.getLast();
                    }).add(one);
        }
        return groups;
    }

    private static boolean same(double one, double other) {
        return Double.isNaN(one) ? Double.isNaN(other) : Math.abs(one - other) <= SAME_TEMPERATURE;
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

    private static Optional<TemperatureLaw> law(List<CurveFits> curves, FitOptions options) {
        List<CurveFits> warm = curves.stream().filter(c -> !Double.isNaN(c.curve().measurement().temperature())).toList();
        if (byTemperature(warm).size() < 2) {
            return Optional.empty();
        }
        List<TemperatureLaw.Measured> measured = new ArrayList<>();
        for (List<CurveFits> alike : byTemperature(warm)) {
            double mean = alike.stream().mapToDouble(c -> c.curve().measurement().temperature()).average().orElseThrow();
            measured.add(new TemperatureLaw.Measured(mean, points(alike)));
        }
        Map<ModelKind, Integer> leading = new LinkedHashMap<>();
        warm.forEach(c -> c.fits().recommended().map(ModelFit::kind).ifPresent(k -> leading.merge(k, 1, Integer::sum)));
        return leading.entrySet().stream().max(Map.Entry.comparingByValue()).flatMap(most -> {
            try {
                return TemperatureLaw.of(most.getKey(), measured, options);
            } catch (ParameterException | IllegalArgumentException noLaw) {
                // The model that leads on most curves does not describe one of the others; each still has its own fit.
                return Optional.empty();
            }
        });
    }
}
