package stirwright.workbench.internal.flow;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import stirwright.rheology.FitOptions;
import stirwright.rheology.ModelKind;
import stirwright.rheology.ParameterException;
import stirwright.rheology.TemperatureLaw;

/** One model over the temperatures of several curves. */
final class Laws {

    private Laws() {}

    /** Empty where the model does not describe every temperature, or one of its parameters is 0 there. */
    static Optional<TemperatureLaw> of(ModelKind kind, List<CurveData> curves, FitOptions options) {
        List<TemperatureLaw.Measured> measured = FitTarget.byTemperature(curves).stream().flatMap(Laws::at).toList();
        try {
            return TemperatureLaw.of(kind, measured, options);
        } catch (IllegalArgumentException | ParameterException tooFewOrBeyond) {
            return Optional.empty();
        }
    }

    private static Stream<TemperatureLaw.Measured> at(List<CurveData> here) {
        double mean = here.stream().mapToDouble(CurveData::temperature).average().orElseThrow();
        return FlowCalculation.pooled(here).map(c -> new TemperatureLaw.Measured(mean, c)).stream();
    }
}
