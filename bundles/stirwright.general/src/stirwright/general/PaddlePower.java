package stirwright.general;

import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** Kamei and Hiraoka's power number over the whole Reynolds range, without and with baffles. */
final class PaddlePower {

    /** nB^0.7 W/D; the plateau of an upright paddle bends off outside its range. */
    private static final Measure SOLIDITY = Measure.of("solidity", "nB^0.7 W/D",
            (vessel, point) -> Math.pow(vessel.get(Dimensions.BLADE_COUNT), 0.7)
                    * vessel.ratio(Dimensions.BLADE_WIDTH, Dimensions.IMPELLER_DIAMETER));

    private static final String PADDLE_ON_DISC =
            "Made for paddles; that a disc turbine behaves like one is an assumption, so it is never recommended.";

    /** A fence that may stand a little off is better than none. */
    private static final String RECALLED = "recalled, unsure";

    private PaddlePower() {}

    static Correlation unbaffledPitchedBlade() {
        return unbaffled("general.np.kamei-hiraoka-pitchedblade-unbaffled",
                        "Kamei and Hiraoka, pitched paddle, no baffles", Blades.PITCHED)
                .families("pitchedblade")
                .transcription(Transcription.FROM_MEMORY)
                .remark("Laminar, 4 blades at 45 degrees: Np Re 47.0 against 44.5 in McCabe's table.")
                .remark("Upright paddles: 3 to 7 % from Nagata's equations at Re 1, within 3 % at Re 10, from "
                        + "6 % below to 43 % above them from Re 100 on.")
                .build();
    }

    static Correlation unbaffledFlatBlade() {
        return unbaffled("general.np.kamei-hiraoka-flatblade-unbaffled",
                        "Kamei and Hiraoka, flat paddle, no baffles", Blades.PADDLE)
                .families("flatblade")
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .remark("Laminar, W/D 1/5: Np Re 35.9 for 2 blades at D/T 1/2 and 69.1 for 6 at 1/3, against 36.5 and 70 in "
                        + "tables; two blades: 3 to 7 % above Nagata's equations at Re 1, within 3 % of them at Re 10.")
                .remark("The coefficients of the turbulent branch are confirmed loosely: from Re 100 on they lie from 6 % "
                        + "below to 43 % above Nagata's equations. " + Sources.XIE)
                .build();
    }

    static Correlation unbaffledDiscTurbine() {
        return unbaffled("general.np.kamei-hiraoka-discturbine-unbaffled",
                        "Kamei and Hiraoka, as for a paddle, no baffles", Blades.UPRIGHT)
                .families("discturbine")
                .transcription(Transcription.UNSURE)
                .remark(PADDLE_ON_DISC)
                .remark("Laminar, 6 blades: Np Re 69.1 against 65 to 71 in tables of disc turbines.")
                .build();
    }

    static Correlation baffledPitchedBlade() {
        return baffled("general.np.kamei-hiraoka-pitchedblade-baffled",
                        "Kamei and Hiraoka, pitched paddle, baffles", Blades.PITCHED)
                .families("pitchedblade")
                .transcription(Transcription.FROM_MEMORY)
                .remark("For Re 100 to 1000 at D/T 1/3 the value without baffles exceeds the plateau; expect 30 % there.")
                .build();
    }

    static Correlation baffledFlatBlade() {
        return baffled("general.np.kamei-hiraoka-flatblade-baffled",
                        "Kamei and Hiraoka, flat paddle, baffles", Blades.PADDLE)
                .families("flatblade")
                .transcription(Transcription.FROM_MEMORY)
                .remark("Conflict: with four baffles of T/10 at D/T 1/3 and Re 1e5 it gives 2.1 and 3.8 for 2 and 4 blades of D/5 and "
                        + "3.0 for 6 of D/8, where tables have 1.7, 3.0 to 3.2 and 2.6 to 3.0.")
                .build();
    }

    static Correlation baffledDiscTurbine() {
        return baffled("general.np.kamei-hiraoka-discturbine-baffled",
                        "Kamei and Hiraoka, as for a paddle, baffles", Blades.UPRIGHT)
                .families("discturbine")
                .transcription(Transcription.UNSURE)
                .range(SOLIDITY, 0.54, 1.6)
                .remark(PADDLE_ON_DISC)
                .remark("Turbulent, 6 blades of D/5 with full baffling: 5.8 against 5 to 6.3 in tables.")
                .build();
    }

    private static CorrelationBuilder unbaffled(String id, String title, Blades blades) {
        return card(id, title, blades)
                .cite(Sources.kameiUnbaffled())
                .unbaffled()
                .contains(Effect.DIAMETER_RATIO, Effect.LIQUID_DEPTH, Effect.BLADE_COUNT, Effect.BAFFLES, Effect.FROUDE)
                .formula("Np = Np0; " + FrictionFrame.formula(blades))
                .relation((vessel, k) -> {
                    FrictionFrame frame = new FrictionFrame(vessel, blades, k);
                    return point -> frame.powerNumber(point.reynolds());
                });
    }

    private static CorrelationBuilder baffled(String id, String title, Blades blades) {
        CorrelationBuilder card = card(id, title, blades);
        BafflePlateau.declareLevel(card, blades);
        BafflePlateau.declareBaffling(card, blades);
        return card.constant("b", 4.5).constant("s", 3)
                .cite(Sources.kameiBaffled())
                .baffled()
                .notStated(Measure.B_OVER_T, "no range is recalled")
                .contains(Effect.DIAMETER_RATIO, Effect.LIQUID_DEPTH, Effect.BLADE_COUNT, Effect.BAFFLES)
                .formula("Np = max(Np0, Npmax (1 + x^-{s})^(-1/{s})); x = {b} " + BafflePlateau.bafflingFormula(blades)
                        + " + Np0/Npmax; " + BafflePlateau.levelFormula(blades) + "; " + FrictionFrame.formula(blades))
                .relation((vessel, k) -> {
                    FrictionFrame frame = new FrictionFrame(vessel, blades, k);
                    double level = BafflePlateau.level(vessel, blades, k);
                    double baffling = k.get("b") * BafflePlateau.baffling(vessel, blades, level, k);
                    double s = k.get("s");
                    return point -> withBaffles(frame.powerNumber(point.reynolds()), level, baffling, s);
                })
                .remark("The published blend alone tends to the plateau and not to the laminar branch when Np0 is far "
                        + "above the plateau; since baffles never lower the power, the larger of the two is taken here.");
    }

    /**
     * The published blend towards the plateau, but never less than without baffles.
     *
     * @param unbaffled power number without baffles at the same Reynolds number
     */
    static double withBaffles(double unbaffled, double level, double baffling, double s) {
        double x = baffling + unbaffled / level;
        return Math.max(unbaffled, level * Math.pow(1 + Math.pow(x, -s), -1 / s));
    }

    private static CorrelationBuilder card(String id, String title, Blades blades) {
        CorrelationBuilder card = FrictionFrame.declare(Correlation.of(id, Quantity.POWER_NUMBER, title), blades)
                .range(Measure.REYNOLDS, Double.NEGATIVE_INFINITY, Sources.COMPARED_UP_TO,
                        "laminar to turbulent in words; our comparison with Nagata's equations ended here")
                .range(Measure.BLADE_COUNT, 2, 8, RECALLED)
                .range(Measure.W_OVER_D, 0.05, 0.9, RECALLED)
                .range(Measure.D_OVER_T, 0.3, 0.8, RECALLED)
                .notStated(Measure.H_OVER_T, "no range is recalled")
                .newtonianData()
                .reads(Variable.REYNOLDS);
        return blades == Blades.PITCHED ? card.notStated(Measure.BLADE_ANGLE, "no range is recalled") : card;
    }
}
