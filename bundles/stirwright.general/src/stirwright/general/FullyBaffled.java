package stirwright.general;

import stirwright.correlation.Citation;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Effect;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** The turbulent power number of paddles with full baffling. */
final class FullyBaffled {

    private FullyBaffled() {}

    static Correlation hiraoka() {
        return card("general.np.hiraoka-1997-fully-baffled", "Hiraoka et al., pitched paddle, full baffling", Blades.PITCHED,
                        "the abstract gives no range")
                .families("pitchedblade")
                .cite(Citation.of("S. Hiraoka, N. Kamei et al., Kagaku Kogaku Ronbunshu 23 (1997) 969-975",
                        "abstract on J-STAGE"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .notStated(Measure.BLADE_ANGLE, "the abstract gives no range")
                .remark("Baffles over full baffling: (B/T) nb^0.8/(0.44 Npmax^0.2 (2 angle/pi)^0.72), the criterion "
                        + "of the abstract.")
                .remark("Four blades at 45 degrees: 1.35, against 1.27 (McCabe), 1.30 (Medek) and 1.37 (Dickey). With "
                        + "D/T 1/3, C/D 1 and H = T it is 4 % above Medek's formula at 45 degrees and 15 % below it at 30.")
                .remark("Conflict: it goes with the width to the power 1, Dickey with 1.25, Bates et al. (1963) with 1.0 to "
                        + "1.25; with the sine Medek to 2.077, Bates et al. to 2.6.")
                .build();
    }

    static Correlation kameiFlatBlade() {
        return card("general.np.kamei-hiraoka-flatblade-fully-baffled", "Kamei and Hiraoka, flat paddle, full baffling",
                        Blades.PADDLE, "no range is recalled")
                .families("flatblade")
                .cite(Sources.kameiBaffled())
                .transcription(Transcription.FROM_MEMORY)
                .remark("Baffles over full baffling: (B/T) nb^0.8/(0.44 Npmax^0.2), the criterion of Hiraoka et al. (1997) "
                        + "for pitched paddles at 90 degrees.")
                .remark("Four baffles of T/10, with which most tables were measured, are little more than half of full baffling for "
                        + "such paddles; Kamei and Hiraoka's curve with baffles accounts for that.")
                .remark("Conflict: for two blades at D/T 1/2 and W/T 1/10 Nagata has 2.99 (unsure) against 2.32.")
                .build();
    }

    private static CorrelationBuilder card(String id, String title, Blades blades, String noRange) {
        Measure overFull = Measure.of("baffling_over_full", "baffles over full baffling",
                (vessel, point) -> BafflePlateau.overFull(vessel, blades));
        return BafflePlateau.declareLevel(Correlation.of(id, Quantity.POWER_NUMBER, title), blades)
                .turbulent()
                .baffled()
                .atLeast(overFull, 1)
                .notStated(Measure.BLADE_COUNT, noRange)
                .notStated(Measure.W_OVER_D, noRange)
                .notStated(Measure.D_OVER_T, noRange)
                .newtonianData()
                .contains(Effect.BAFFLES)
                .formula("Np = Npmax; " + BafflePlateau.levelFormula(blades))
                .relation((vessel, k) -> {
                    double np = BafflePlateau.level(vessel, blades, k);
                    return point -> np;
                });
    }
}
