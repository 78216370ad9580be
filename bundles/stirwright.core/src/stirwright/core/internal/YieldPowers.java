package stirwright.core.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import stirwright.core.CaseSpec;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.core.YieldEffect;
import stirwright.correlation.Figures;
import stirwright.rheology.ModelKind;
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
        YieldBounds bounds = spec.fluid().yieldRange();
        return bounds.known() ? new YieldEffect(bounds.low(), bounds.high(), Double.NaN, Double.NaN) : YieldEffect.NONE;
    }

    YieldEffect of(ResultAssembly.Row pick) {
        YieldBounds bounds = spec.fluid().yieldRange();
        return bounds.known()
                ? new YieldEffect(bounds.low(), bounds.high(), power(pick, bounds.low()), power(pick, bounds.high()))
                : YieldEffect.NONE;
    }

    /** By the same correlations as the pick's own power; a target is not met anew, since a drive keeps its speed. */
    private double power(ResultAssembly.Row pick, double yieldStress) {
        Optional<FluidState> settled = pick.power().trial().state();
        Optional<Candidate> constant = pick.constants().pick().map(c -> c.trial().candidate());
        if (Double.isNaN(yieldStress) || settled.isEmpty() || constant.isEmpty() || !yields()) {
            return Double.NaN;
        }
        Candidate power = pick.power().trial().candidate();
        return new Coupling(spec.fluid().withYieldStress(yieldStress), diameter, trials)
                .at(settled.get().speed(), constant.get()).state()
                .map(state -> state.power(power.value(trials.setUp(new Point(), state, power), state)))
                .filter(watts -> watts > 0 && watts < Double.POSITIVE_INFINITY)
                .orElse(Double.NaN);
    }

    private boolean yields() {
        return ModelKind.of(spec.fluid().model()).yields();
    }

    /** What a reader of the pick's power must know of it. */
    List<String> notes(YieldEffect effect) {
        List<String> notes = new ArrayList<>();
        if (yields() && spec.fluid().yieldRange().known()) {
            notes.add(range(effect));
        }
        double atRest = spec.fluid().yieldBounds().atRest();
        if (!Double.isNaN(atRest)) {
            notes.add(startUp(atRest));
        }
        return notes;
    }

    /** No power of a running vessel rests on it. */
    private String startUp(double atRest) {
        double running = spec.fluid().model().yieldStress();
        String doubt = atRest < running ? ", which is below the model's " + Figures.show(running) + " Pa, so check both" : "";
        return "static yield stress " + Figures.show(atRest) + " Pa" + doubt
                + ": start-up after rest needs its own check with the drive's maker";
    }

    private String range(YieldEffect effect) {
        String stress = between(effect.low(), effect.high(), "Pa")
                + (effect.high() == spec.fluid().yieldBounds().atRest() ? ", the higher end after rest" : "");
        String power = Double.isNaN(effect.powerLow()) && Double.isNaN(effect.powerHigh())
                ? "; the pick gives no power there"
                : "; with that, at the same speed and with the other parameters as they are, the pick's power is "
                        + between(effect.powerLow(), effect.powerHigh(), "W");
        return "yield stress given as " + stress + power;
    }

    private static String between(double low, double high, String unit) {
        if (Double.isNaN(high)) {
            return "at least " + Figures.show(low) + " " + unit;
        }
        return (Double.isNaN(low) ? "at most " : Figures.show(low) + " to ") + Figures.show(high) + " " + unit;
    }
}
