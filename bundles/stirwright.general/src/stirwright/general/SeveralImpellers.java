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

/** Equal impellers on one shaft, far enough apart that each works as if it were alone. */
final class SeveralImpellers {

    static final String BATES = "R. L. Bates, P. L. Fondy and R. R. Corpstein, Ind. Eng. Chem. Process Des. Dev. 2 (1963) "
            + "310-314";

    private static final Measure SPACING_OVER_VESSEL =
            Measure.ratio(Dimensions.IMPELLER_SPACING, Dimensions.VESSEL_DIAMETER);

    private SeveralImpellers() {}

    static Correlation power() {
        return times("general.np.several-impellers", Quantity.POWER_NUMBER, "powers of several impellers add")
                .anyFamily()
                .cite(bates())
                .transcription(Transcription.FROM_MEMORY)
                .atLeast(Measure.S_OVER_D, 1)
                .remark("The full sum is recalled for S/D from 1 to 1.5 on.")
                .remark("Conflict: for two pitched-blade turbines at S/D 1 less is reported, see general.np.two-pitched-blades.")
                .build();
    }

    static Correlation powerOfDiscTurbines() {
        return times("general.np.several-disc-turbines", Quantity.POWER_NUMBER, "powers of several disc turbines add")
                .families("discturbine")
                .cite(bates())
                .transcription(Transcription.FROM_MEMORY)
                .atLeast(Measure.S_OVER_D, 1)
                .atLeast(SPACING_OVER_VESSEL, CloseImpellers.MERGING_BELOW)
                .appliesWhen("more than one impeller, and not two whose flows merge",
                        vessel -> several(vessel) && !CloseImpellers.merge(vessel))
                .remark("Closer than about 0.4 T the flows of disc turbines merge; for two there is a factor of its own, of "
                        + "more nothing is known.")
                .build();
    }

    static Correlation flow() {
        return times("general.nq.several-impellers", Quantity.FLOW_NUMBER, "flows of several impellers add")
                .anyFamily()
                .cite(Citation.commonPractice())
                .transcription(Transcription.FROM_MEMORY)
                .notStated(Measure.S_OVER_D, "a rule of the trade without a range")
                .remark("An upper estimate: part of one impeller's discharge is the next one's suction.")
                .build();
    }

    private static Citation bates() {
        return Citation.withoutLocator(BATES);
    }

    private static CorrelationBuilder times(String id, Quantity quantity, String title) {
        return Correlation.modifier(id, quantity, Effect.SEVERAL_IMPELLERS, title)
                .appliesWhen("more than one impeller", SeveralImpellers::several)
                .notStated(Measure.REYNOLDS, "recalled without a range")
                .notStated(Classifier.BAFFLING, "recalled without it")
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .newtonianData()
                .formula("times ni")
                .relation((vessel, k) -> {
                    double count = vessel.get(Dimensions.IMPELLER_COUNT);
                    return point -> count;
                });
    }

    private static boolean several(Geometry vessel) {
        return vessel.get(Dimensions.IMPELLER_COUNT) > 1;
    }
}
