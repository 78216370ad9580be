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

    /** Up to here the unbaffled equations were compared with Nagata's; the source says turbulent, no number. */
    private static final double COMPARED_UP_TO = 1e5;

    /** nB^0.7 W/D; the plateau of an upright paddle bends off outside its range. */
    private static final Measure SOLIDITY = Measure.of("solidity", "nB^0.7 W/D",
            (vessel, point) -> Math.pow(vessel.get(Dimensions.BLADE_COUNT), 0.7)
                    * vessel.ratio(Dimensions.BLADE_WIDTH, Dimensions.IMPELLER_DIAMETER));

    private static final String PADDLE_ON_DISC =
            "Made for paddles; that a disc turbine behaves like one is an assumption, so it is never recommended.";

    private PaddlePower() {}

    static Correlation unbaffledPitchedBlade() {
        return unbaffled("general.np.kamei-hiraoka-pitchedblade-unbaffled",
                        "Kamei and Hiraoka, pitched paddle, no baffles", Blades.PITCHED)
                .families("pitchedblade")
                .transcription(Transcription.FROM_MEMORY)
                .remark("Laminar, 4 blades at 45 degrees: Np Re 47.0 against 44.5 in McCabe's table.")
                .remark("Upright paddles: 2 to 7 % from Nagata's equations at Re 1, 1 to 4 % at Re 10, from "
                        + "6 % below to 43 % above them from Re 100 on.")
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
                .range(Measure.REYNOLDS, Double.NEGATIVE_INFINITY, COMPARED_UP_TO,
                        "laminar to turbulent in words; our comparison with Nagata's equations ended here")
                .notStated(Measure.BLADE_COUNT, "recalled as 2 to 8, unsure")
                .notStated(Measure.W_OVER_D, "recalled as 0.05 to 0.9, unsure")
                .notStated(Measure.D_OVER_T, "recalled as 0.3 to 0.8, unsure")
                .notStated(Measure.H_OVER_T, "no range is recalled")
                .newtonianData()
                .reads(Variable.REYNOLDS);
        return blades == Blades.PITCHED ? card.notStated(Measure.BLADE_ANGLE, "no range is recalled") : card;
    }
}
