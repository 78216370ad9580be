package stirwright.core;

import java.util.List;
import java.util.Optional;
import stirwright.correlation.FlowKind;
import stirwright.correlation.Regime;
import stirwright.correlation.Verdict;

/**
 * One power-number candidate of a case. Numbers are NaN where they mean nothing.
 *
 * @param correlation id, or "given"
 * @param failedBounds each stated bound that fails, with what the case has
 * @param why one sentence for why or why not
 * @param state speed, shear rate, viscosity and Reynolds number; empty when none was found
 * @param shearRateCorrelation id of the shear-rate constant used, or "given"
 * @param powerNumber total, all impellers and vessel effects included
 * @param power W
 * @param torque N m, power/(2 pi speed)
 * @param powerPerVolume W/m3
 * @param powerBasedShearRate 1/s: the uniform shear rate that would take up this power per volume
 * @param yieldEffect the bounds of the yield stress, and of the pick what they do to the power
 * @param flowNumber total, all impellers included
 * @param pumping m3/s
 * @param deviation power over the pick's power, minus 1
 * @param notes the modifiers applied and those left out, with their factors; which of its shear rates lie outside of the
 *     measured window, where the case's flags and notes do not say so of the pick
 */
public record CandidateResult(
        String correlation, Role role, Verdict verdict, List<String> failedBounds, String why,
        Optional<Regime> regime, Optional<FluidState> state, String shearRateCorrelation,
        double powerNumber, double power, double torque, double powerPerVolume,
        double powerBasedShearRate, YieldEffect yieldEffect,
        String flowCorrelation, Optional<FlowKind> flowKind, double flowNumber, double pumping,
        double deviation, List<String> notes) {}
