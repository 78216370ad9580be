package stirwright.core.internal;

import java.util.Optional;
import stirwright.core.CaseSpec;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.core.YieldEffect;
import stirwright.correlation.Figures;
import stirwright.rheology.YieldBounds;

/** The pick's power again with the least and the greatest yield stress, at the speed that is settled for the case. */
final class YieldPowers {
    private final CaseSpec spec;
    private final double diameter;
    private final Trials trials;

    /** @param diameter impeller diameter, m */
    YieldPowers(CaseSpec spec, double diameter, Trials trials) {
        this.spec = spec;
        this.diameter = diameter;
        this.trials = trials;
    }

    /** The bounds alone, for candidates that are not the pick. */
    YieldEffect bounds() {
        YieldBounds bounds = spec.fluid().yieldBounds();
        return bounds.known() ? new YieldEffect(bounds.low(), bounds.high(), Double.NaN, Double.NaN) : YieldEffect.NONE;
    }

    YieldEffect of(ResultAssembly.Row pick) {
        YieldBounds bounds = spec.fluid().yieldBounds();
        return bounds.known()
                ? new YieldEffect(bounds.low(), bounds.high(), power(pick, bounds.low()), power(pick, bounds.high()))
                : YieldEffect.NONE;
    }

    /** By the same correlations as the pick's own power; a target is not met anew, since a drive keeps its speed. */
    private double power(ResultAssembly.Row pick, double yieldStress) {
        Optional<FluidState> settled = pick.power().trial().state();
        Optional<Candidate> constant = pick.constants().pick().map(c -> c.trial().candidate());
        if (Double.isNaN(yieldStress) || settled.isEmpty() || constant.isEmpty()) {
            return Double.NaN;
        }
        Candidate power = pick.power().trial().candidate();
        return new Coupling(spec.fluid().withYieldStress(yieldStress), diameter, trials)
                .at(settled.get().speed(), constant.get()).state()
                .map(state -> state.power(power.value(trials.setUp(new Point(), state, power), state)))
                .filter(watts -> watts > 0 && watts < Double.POSITIVE_INFINITY)
                .orElse(Double.NaN);
    }

    /** What a reader of the pick's power must know of it. */
    static Optional<String> note(YieldEffect effect) {
        if (Double.isNaN(effect.low()) && Double.isNaN(effect.high())) {
            return Optional.empty();
        }
        String stress = between(effect.low(), effect.high(), "Pa");
        String power = Double.isNaN(effect.powerLow()) && Double.isNaN(effect.powerHigh())
                ? "; the pick gives no power there"
                : "; with that, at the same speed and with the other parameters as they are, the pick's power is "
                        + between(effect.powerLow(), effect.powerHigh(), "W");
        return Optional.of("yield stress given as " + stress + power);
    }

    private static String between(double low, double high, String unit) {
        if (Double.isNaN(high)) {
            return "at least " + Figures.show(low) + " " + unit;
        }
        return (Double.isNaN(low) ? "at most " : Figures.show(low) + " to ") + Figures.show(high) + " " + unit;
    }
}
