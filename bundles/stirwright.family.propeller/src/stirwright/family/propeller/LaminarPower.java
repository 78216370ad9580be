package stirwright.family.propeller;

import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** Power numbers of the laminar regime: a constant over the Reynolds number, by pitch. */
final class LaminarPower {

    private LaminarPower() {}

    static Correlation square() {
        return row("pitch-1", "square pitch", 1)
                .cite(Sources.mccabe("chapter 9, table of K_L and K_T; the number read in Subbarao et al., Fluid Mechanics, "
                        + "Heat Transfer and Mass Transfer, p. 166"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .notStated(Measure.D_OVER_T, "the number was read without a range for it")
                .overReynolds("KL", 41)
                .remark("Earle's food text works an example with the same 41, though at Re 188, where Rushton et al. "
                        + "(1950) print more than three times as much.")
                .remark("Rushton et al. (1950) have 8.3 at Re 5 with and without baffles, which is 41.5.")
                .build();
    }

    static Correlation oneAndAHalf() {
        return row("pitch-1-5", "pitch 1.5", 1.5)
                .cite(Sources.mccabeSomeEdition())
                .transcription(Transcription.FROM_MEMORY)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .overReynolds("KL", 48)
                .remark("Conflict: another edition has 55; which has which is not recalled.")
                .build();
    }

    static Correlation two() {
        return row("pitch-2", "pitch 2", 2)
                .cite(Sources.mccabeSomeEdition())
                .transcription(Transcription.FROM_MEMORY)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .overReynolds("KL", 43.5)
                .remark("Conflict: it lies below the 48 or 55 of pitch 1.5, which stand in other editions of the same "
                        + "table; a steeper blade should not draw less.")
                .build();
    }

    /** What the rows of the table share. */
    private static CorrelationBuilder row(String id, String title, double pitch) {
        return Correlation.of("propeller.np.mccabe-laminar-" + id, Quantity.POWER_NUMBER,
                        "McCabe, Smith and Harriott, " + title + ", laminar")
                .families(Propeller.ID)
                .atMost(Measure.REYNOLDS, 10)
                .baffled(4, 0.1)
                .oneOf(Measure.BLADE_COUNT, 3)
                .nominal(Propeller.PITCH, pitch)
                .newtonianData()
                .remark("In laminar flow baffles do not act.");
    }
}
