package stirwright.family.discturbine;

import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.Effect;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** Power numbers of the laminar regime: a constant over the Reynolds number. */
final class LaminarPower {

    private LaminarPower() {}

    static Correlation mccabe() {
        return Correlation.of("discturbine.np.mccabe-laminar", Quantity.POWER_NUMBER,
                        "McCabe, Smith and Harriott, laminar")
                .families(DiscTurbine.ID)
                .cite(Sources.mccabe("chapter 9, table of K_L and K_T, headed: "
                        + "four baffles a tenth of the vessel wide (heading from memory)"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .atMost(Measure.REYNOLDS, 10)
                .baffled(4, 0.1)
                .oneOf(Measure.BLADE_COUNT, 6)
                .nominal(Measure.W_OVER_D, 0.2)
                .notStated(Measure.D_OVER_T, "the row was read without a range for it")
                .newtonianData()
                .overReynolds("KL", 65)
                .remark("In laminar flow baffles do not act.")
                .remark("Conflict: Rushton et al. have 71, and about 70 is usual.")
                .build();
    }

    static Correlation rushton() {
        return Correlation.of("discturbine.np.rushton-1950-laminar", Quantity.POWER_NUMBER,
                        "Rushton, Costich and Everett, laminar")
                .families(DiscTurbine.ID)
                .cite(Sources.rushtonTable("column Re 5"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .atMost(Measure.REYNOLDS, 10)
                .inClass(Classifier.BAFFLING, Classifier.BAFFLED, Classifier.UNBAFFLED)
                .oneOf(Measure.BLADE_COUNT, 4, 6, 12)
                .notStated(Measure.W_OVER_D, Sources.NO_WIDTH)
                .nominal(Measure.D_OVER_T, 1.0 / 3)
                .nominal(Measure.H_OVER_T, 1)
                .nominal(Measure.C_OVER_D, 1)
                .newtonianData()
                .contains(Effect.BLADE_COUNT)
                .overReynolds("KL", 71)
                .remark("71 is the table's 14.2 at Re 5, the same for 4, 6 and 12 blades, with and without "
                        + "baffles; the same page has the slope -1 up to Re 10.")
                .remark("Conflict: McCabe, Smith and Harriott have 65.")
                .build();
    }
}
