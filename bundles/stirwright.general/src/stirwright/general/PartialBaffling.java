package stirwright.general;

import stirwright.correlation.BoundCorrelation;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Geometry;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** Fewer or narrower baffles than full baffling, as a factor on the power numbers of tables. */
final class PartialBaffling {

    private static final Correlation UNBAFFLED = PaddlePower.unbaffledPitchedBlade();
    private static final Correlation PLATEAU = FullyBaffled.hiraoka();

    private PartialBaffling() {}

    static Correlation pitchedBlade() {
        return TurbulentFactor.declare(BafflePlateau.declareBaffling(Correlation.modifier(
                        "general.np.kamei-hiraoka-partial-baffling", Quantity.POWER_NUMBER, Effect.BAFFLES,
                        "less than full baffling, Kamei and Hiraoka"), Blades.PITCHED))
                .families("pitchedblade")
                .appliesWhen("baffles, but fewer or narrower than the criterion of full baffling asks for",
                        PartialBaffling::lessThanFull)
                .cite(Sources.kameiBaffled())
                .transcription(Transcription.FROM_MEMORY)
                .baffled()
                .notStated(Measure.B_OVER_T, "no range is recalled")
                .notStated(Measure.BLADE_COUNT, "recalled as 2 to 8, unsure")
                .notStated(Measure.BLADE_ANGLE, "no range is recalled")
                .notStated(Measure.W_OVER_D, "recalled as 0.05 to 0.9, unsure")
                .notStated(Measure.D_OVER_T, "recalled as 0.3 to 0.8, unsure")
                .notStated(Measure.H_OVER_T, "no range is recalled")
                .constant("b", 4.5)
                .constant("s", 3)
                .formula("(1 + x^-{s})^(-1/{s}); x = {b} " + BafflePlateau.bafflingFormula(Blades.PITCHED)
                        + " + Np0/Npmax; Np0 by " + UNBAFFLED.id() + ", Npmax by " + PLATEAU.id()
                        + TurbulentFactor.formula(";", "1"))
                .relation((vessel, k) -> {
                    BoundCorrelation unbaffled = UNBAFFLED.bind(vessel);
                    double level = BafflePlateau.level(vessel, Blades.PITCHED, PLATEAU.constants());
                    double baffling = k.get("b") * BafflePlateau.baffling(vessel, Blades.PITCHED, level, k);
                    double s = k.get("s");
                    return point -> point.reynolds() < TurbulentFactor.FROM ? 1
                            : Math.pow(1 + Math.pow(baffling + unbaffled.at(point) / level, -s), -1 / s);
                })
                .remark("Tables of power numbers were measured with full baffling. With the criterion just met the blend is "
                        + "about 0.96 to 0.99; from there on no factor is used.")
                .build();
    }

    private static boolean lessThanFull(Geometry vessel) {
        return vessel.get(Dimensions.BAFFLE_COUNT) > 0 && BafflePlateau.overFull(vessel, Blades.PITCHED) < 1;
    }
}
