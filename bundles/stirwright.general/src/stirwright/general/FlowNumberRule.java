package stirwright.general;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** The rule of the trade that ties the shear-rate constant of axial-flow impellers to their flow number. */
final class FlowNumberRule {

    private FlowNumberRule() {}

    static Correlation sevenTimes() {
        return Correlation.of("general.ks.seven-times-flow-number", Quantity.SHEAR_RATE_CONSTANT,
                        "rule of the trade, from the flow number")
                .families("propeller", "hydrofoil", "pitchedblade")
                .cite(Citation.commonPractice())
                .transcription(Transcription.FROM_MEMORY)
                .range(Measure.REYNOLDS, Double.NEGATIVE_INFINITY, RegimeLimits.IN_GENERAL.laminarUpTo(),
                        "laminar flow, for which shear-rate constants are defined; the rule itself names no regime")
                .notStated(Classifier.BAFFLING, "a rule of the trade without a range")
                .notStated(Measure.D_OVER_T, "a rule of the trade without a range")
                .notStated(Classifier.FLUID, "a rule of the trade without a range")
                .reads(Variable.FLOW_NUMBER)
                .constant("k", 7)
                .formula("ks = {k} Nq")
                .relation((vessel, k) -> {
                    double factor = k.get("k");
                    return point -> factor * point.get(Variable.FLOW_NUMBER);
                })
                .remark("Conflict: published constants of laminar flow ask for another factor: a propeller's 10 at Nq 0.5 for "
                        + "20, a hydrofoil's 10 at Nq 0.55 for 18, a 45-degree pitched blade's 11 at Nq 0.79 for 14.")
                .remark("Conflict: the constant that reproduces the power rests on the laminar power and the height of the "
                        + "blades and not on the flow: a propeller and a disc turbine both have about 10.")
                .remark("Flow numbers are those of turbulent flow, and in laminar flow an impeller pumps far less.")
                .build();
    }
}
