package stirwright.family.propeller;

import stirwright.correlation.Correlation;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** Power numbers of the laminar regime: a constant over the Reynolds number, by pitch. */
final class LaminarPower {

    private static final String BAFFLES_REST = "In laminar flow baffles do not act.";

    private LaminarPower() {}

    static Correlation square() {
        return Correlation.of("propeller.np.mccabe-laminar-pitch-1", Quantity.POWER_NUMBER,
                        "McCabe, Smith and Harriott, square pitch, laminar")
                .families(Propeller.ID)
                .cite(Sources.mccabe("chapter 9, table of K_L and K_T; the number read in Subbarao et al., Fluid Mechanics, "
                        + "Heat Transfer and Mass Transfer, p. 166"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .atMost(Measure.REYNOLDS, 10)
                .baffled(4, 0.1)
                .oneOf(Measure.BLADE_COUNT, 3)
                .nominal(Propeller.PITCH, 1)
                .notStated(Measure.D_OVER_T, "the number was read without a range for it")
                .newtonianData()
                .overReynolds("KL", 41)
                .remark(BAFFLES_REST)
                .remark("Earle's food text works an example with the same 41, though at Re 188, where Rushton et al. "
                        + "(1950) print more than three times as much.")
                .remark("Rushton et al. (1950) have 8.3 at Re 5 with and without baffles, which is 41.5.")
                .build();
    }

    static Correlation oneAndAHalf() {
        return Correlation.of("propeller.np.mccabe-laminar-pitch-1-5", Quantity.POWER_NUMBER,
                        "McCabe, Smith and Harriott, pitch 1.5, laminar")
                .families(Propeller.ID)
                .cite(Sources.mccabeSomeEdition())
                .transcription(Transcription.FROM_MEMORY)
                .atMost(Measure.REYNOLDS, 10)
                .baffled(4, 0.1)
                .oneOf(Measure.BLADE_COUNT, 3)
                .nominal(Propeller.PITCH, 1.5)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .newtonianData()
                .overReynolds("KL", 48)
                .remark(BAFFLES_REST)
                .remark("Conflict: another edition has 55; which has which is not recalled.")
                .build();
    }

    static Correlation two() {
        return Correlation.of("propeller.np.mccabe-laminar-pitch-2", Quantity.POWER_NUMBER,
                        "McCabe, Smith and Harriott, pitch 2, laminar")
                .families(Propeller.ID)
                .cite(Sources.mccabeSomeEdition())
                .transcription(Transcription.FROM_MEMORY)
                .atMost(Measure.REYNOLDS, 10)
                .baffled(4, 0.1)
                .oneOf(Measure.BLADE_COUNT, 3)
                .nominal(Propeller.PITCH, 2)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .newtonianData()
                .overReynolds("KL", 43.5)
                .remark(BAFFLES_REST)
                .remark("Conflict: it lies below the 48 or 55 of pitch 1.5, which stand in other editions of the same "
                        + "table; a steeper blade should not draw less.")
                .build();
    }
}
