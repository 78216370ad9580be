package stirwright.general;

import static stirwright.correlation.Dimensions.BLADE_WIDTH;
import static stirwright.correlation.Dimensions.IMPELLER_DIAMETER;
import static stirwright.correlation.Dimensions.VESSEL_DIAMETER;

import stirwright.correlation.Citation;
import stirwright.correlation.Constants;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Effect;
import stirwright.correlation.Geometry;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** Nagata's power number of a paddle of two blades: without baffles over all regimes, and fully baffled. */
final class NagataPaddle {

    private static final Measure WIDTH_OVER_VESSEL = Measure.ratio(BLADE_WIDTH, VESSEL_DIAMETER);

    /** Recalled as about 0.2. */
    private static final double WIDEST = 0.2;

    /** The critical Reynolds number has a pole at 0.0048/0.11 = 0.0436. */
    private static final double CLEAR_OF_THE_POLE = 0.05;

    private NagataPaddle() {}

    static Correlation unbaffledFlatBlade() {
        return unbaffled("general.np.nagata-flatblade-unbaffled", "Nagata, two-blade paddle, no baffles", Blades.PADDLE)
                .families("flatblade")
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .remark("Checked against Kamei and Hiraoka's equations, which share nothing with these: 3 to 7 % below "
                        + "them at Re 1, within 3 % at Re 10, for six vessels of D/T 0.3 to 0.7 and W/T 0.06 to 0.2.")
                .remark("Conflict: from Re 100 on Kamei and Hiraoka are up to 43 % above, most at small D/T. " + Sources.XIE)
                .build();
    }

    static Correlation unbaffledPitchedBlade() {
        return unbaffled("general.np.nagata-pitchedblade-unbaffled", "Nagata, pitched two-blade paddle, no baffles",
                        Blades.PITCHED)
                .families("pitchedblade")
                .transcription(Transcription.FROM_MEMORY)
                .notStated(Measure.BLADE_ANGLE, "no range is recalled")
                .remark("As recalled the angle lowers the turbulent branch alone. Two blades at 45 degrees, D/T 1/2, W/D "
                        + "1/5: 6 % above Kamei and Hiraoka at Re 1, 11 % above at Re 10, 27 % below at Re 1e5.")
                .remark("Conflict: in transitional and turbulent flow Kamei and Hiraoka are higher. " + Sources.XIE)
                .build();
    }

    static Correlation baffledFlatBlade() {
        return baffled("general.np.nagata-flatblade-baffled", "Nagata, two-blade paddle, full baffling", Blades.PADDLE)
                .families("flatblade")
                .remark("Conflict: for D/T 1/2 and W/T 1/10 it gives 2.99, Kamei and Hiraoka's plateau 2.32 and a table of "
                        + "McCabe, Smith and Harriott 1.70; over D/T 0.4 to 0.6 and W/T 0.08 to 0.2 it is 7 to 33 % above the "
                        + "plateau.")
                .build();
    }

    static Correlation baffledPitchedBlade() {
        return baffled("general.np.nagata-pitchedblade-baffled", "Nagata, pitched two-blade paddle, full baffling",
                        Blades.PITCHED)
                .families("pitchedblade")
                .notStated(Measure.BLADE_ANGLE, "no range is recalled")
                .remark("Two blades at 45 degrees, D/T 0.4 to 0.6, W/T 0.08 to 0.2: from 10 % below to 11 % above Hiraoka "
                        + "et al. (1997).")
                .build();
    }

    private static CorrelationBuilder unbaffled(String id, String title, Blades blades) {
        return card(id, title, blades)
                .range(Measure.REYNOLDS, Double.NEGATIVE_INFINITY, RegimeLimits.IN_GENERAL.laminarUpTo(),
                        "laminar; the source goes on to turbulent flow, where later measurements left it")
                .unbaffled()
                .range(WIDTH_OVER_VESSEL, Double.NEGATIVE_INFINITY, WIDEST, "the usual range")
                .contains(Effect.DIAMETER_RATIO, Effect.LIQUID_DEPTH, Effect.BAFFLES, Effect.FROUDE)
                .reads(Variable.REYNOLDS)
                .laminarLimit()
                .formula("Np = " + NagataCurve.formula(blades, "Re"))
                .relation((vessel, k) -> {
                    NagataCurve curve = new NagataCurve(vessel, blades, k);
                    return point -> curve.powerNumber(point.reynolds());
                });
    }

    private static CorrelationBuilder baffled(String id, String title, Blades blades) {
        CorrelationBuilder card = card(id, title, blades)
                .constant("r1", 25).constant("r2", 0.4).constant("r3", 0.11).constant("r4", 0.0048);
        if (blades == Blades.PITCHED) {
            card.constant("r5", 4);
        }
        return card.transcription(Transcription.UNSURE)
                .turbulent()
                .baffled()
                .notStated(Measure.B_OVER_T, "recalled as fully baffled, without a baffle width")
                .range(WIDTH_OVER_VESSEL, CLEAR_OF_THE_POLE, WIDEST,
                        "the usual range; below, the critical Reynolds number has a pole at 0.0436")
                .contains(Effect.DIAMETER_RATIO, Effect.LIQUID_DEPTH, Effect.BAFFLES)
                .formula("Np = " + NagataCurve.formula(blades, "Rc")
                        + "; Rc = ({r1} (T/W)(D/T - {r2})^2 + (W/T)/({r3} W/T - {r4}))"
                        + blades.onlyPitched(" 10^({r5} (1 - sin(angle)))"))
                .relation((vessel, k) -> {
                    double np = new NagataCurve(vessel, blades, k).powerNumber(criticalReynolds(vessel, blades, k));
                    return point -> np;
                })
                .remark("With full baffling the power number stays what it is without baffles at the critical Reynolds "
                        + "number Rc; the coefficients of Rc are recalled and unsure.");
    }

    private static CorrelationBuilder card(String id, String title, Blades blades) {
        return NagataCurve.declare(Correlation.of(id, Quantity.POWER_NUMBER, title), blades)
                .cite(Citation.of("S. Nagata, Mixing: Principles and Applications, Kodansha and Halsted (1975), after S. "
                        + "Nagata, K. Yokoyama and H. Maeda, Kagaku Kogaku 20 (1956) 582", "chapter 1"))
                .oneOf(Measure.BLADE_COUNT, 2)
                .notStated(Measure.D_OVER_T, "no range is recalled; compared from 0.3 to 0.7")
                .notStated(Measure.H_OVER_T, "no range is recalled")
                .newtonianData();
    }

    private static double criticalReynolds(Geometry vessel, Blades blades, Constants k) {
        double w = vessel.ratio(BLADE_WIDTH, VESSEL_DIAMETER);
        double off = vessel.ratio(IMPELLER_DIAMETER, VESSEL_DIAMETER) - k.get("r2");
        double upright = k.get("r1") / w * off * off + w / (k.get("r3") * w - k.get("r4"));
        return blades == Blades.PITCHED ? upright * Math.pow(10, k.get("r5") * (1 - blades.sine(vessel))) : upright;
    }
}
