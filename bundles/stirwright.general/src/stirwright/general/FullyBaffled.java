package stirwright.general;

import stirwright.correlation.Citation;
import stirwright.correlation.Correlation;
import stirwright.correlation.Effect;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** Hiraoka's power number of a pitched paddle with full baffling, turbulent. */
final class FullyBaffled {

    private static final Measure BAFFLING_OVER_FULL = Measure.of("baffling_over_full",
            "baffles over full baffling",
            (vessel, point) -> BafflePlateau.overFull(vessel));

    private FullyBaffled() {}

    static Correlation hiraoka() {
        return BafflePlateau.declareLevel(Correlation.of("general.np.hiraoka-1997-fully-baffled", Quantity.POWER_NUMBER,
                        "Hiraoka et al., pitched paddle, full baffling"), Blades.PITCHED)
                .families("pitchedblade")
                .cite(Citation.of("S. Hiraoka, N. Kamei et al., Kagaku Kogaku Ronbunshu 23 (1997) 969-975",
                        "abstract on J-STAGE"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .turbulent()
                .baffled()
                .atLeast(BAFFLING_OVER_FULL, 1)
                .notStated(Measure.BLADE_COUNT, "the abstract gives no range")
                .notStated(Measure.BLADE_ANGLE, "the abstract gives no range")
                .notStated(Measure.W_OVER_D, "the abstract gives no range")
                .notStated(Measure.D_OVER_T, "the abstract gives no range")
                .newtonianData()
                .contains(Effect.BAFFLES)
                .formula("Np = Npmax; " + BafflePlateau.levelFormula(Blades.PITCHED))
                .relation((vessel, k) -> {
                    double np = BafflePlateau.level(vessel, Blades.PITCHED, k);
                    return point -> np;
                })
                .remark("Baffles over full baffling: (B/T) nb^0.8/(0.44 Npmax^0.2 (2 angle/pi)^0.72), the criterion "
                        + "of the abstract.")
                .remark("Four blades at 45 degrees: 1.35, against 1.27 (McCabe), 1.30 (Medek) and 1.37 (Dickey).")
                .build();
    }
}
