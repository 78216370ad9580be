package stirwright.general;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Geometry;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** Two impellers so close that one works in the flow of the other: less than twice the power of one. */
final class CloseImpellers {

    /** Below it the flows of two disc turbines merge. */
    static final double MERGING_BELOW = 0.4;

    /** One diameter apart, with the slack of rounded drawings. */
    private static final double ONE_DIAMETER = 1.025;

    private CloseImpellers() {}

    /** Whether the flows of two disc turbines merge. */
    static boolean merge(Geometry vessel) {
        return two(vessel)
                && vessel.ratio(Dimensions.IMPELLER_SPACING, Dimensions.VESSEL_DIAMETER) < MERGING_BELOW;
    }

    static Correlation discTurbines() {
        return pair("general.np.merging-disc-turbines", "two disc turbines whose flows merge", 1.6)
                .families("discturbine")
                .appliesWhen("two impellers less than 0.4 T apart", CloseImpellers::merge)
                .cite(Citation.withoutLocator(SeveralImpellers.BATES + "; S. Hudcova, V. Machon and A. W. Nienow, "
                        + "Biotechnol. Bioeng. 34 (1989) 617; K. Rutherford et al., AIChE J. 42 (1996) 332"))
                .scatter(0.063)
                .remark("1.5 to 1.7 times one are reported for two disc turbines closer than about 0.4 T; this is the middle. "
                        + "Which of the three works has which end is not checked.")
                .build();
    }

    static Correlation pitchedBlades() {
        return pair("general.np.two-pitched-blades", "two pitched-blade turbines one diameter apart", 1.75)
                .families("pitchedblade")
                .appliesWhen("two impellers up to one diameter apart", vessel -> two(vessel)
                        && vessel.ratio(Dimensions.IMPELLER_SPACING, Dimensions.IMPELLER_DIAMETER) <= ONE_DIAMETER)
                .cite(Citation.withoutLocator(SeveralImpellers.BATES))
                .scatter(0.086)
                .nominal(Measure.S_OVER_D, 1)
                .remark("1.6 to 1.9 times one are reported one diameter apart, and less where the impellers touch; this is the "
                        + "middle.")
                .remark("Conflict: the rule that powers add is recalled for S/D from 1 to 1.5 on as well.")
                .build();
    }

    private static CorrelationBuilder pair(String id, String title, double timesOne) {
        return TurbulentFactor.declare(
                        Correlation.modifier(id, Quantity.POWER_NUMBER, Effect.SEVERAL_IMPELLERS, title))
                .transcription(Transcription.FROM_MEMORY)
                .notStated(Classifier.BAFFLING, "recalled without it")
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .constant("a", timesOne)
                .formula(TurbulentFactor.formula("times {a}", "times 2"))
                .relation((vessel, k) -> TurbulentFactor.of(k.get("a"), 2))
                .remark("Below turbulent flow the plain sum stands, which is ours since nothing is reported there; the step between "
                        + "the two is not physical.");
    }

    private static boolean two(Geometry vessel) {
        return vessel.get(Dimensions.IMPELLER_COUNT) == 2;
    }
}
