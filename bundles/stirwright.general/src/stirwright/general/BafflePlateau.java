package stirwright.general;

import static stirwright.correlation.Dimensions.BAFFLE_COUNT;
import static stirwright.correlation.Dimensions.BAFFLE_WIDTH;
import static stirwright.correlation.Dimensions.BLADE_COUNT;
import static stirwright.correlation.Dimensions.BLADE_WIDTH;
import static stirwright.correlation.Dimensions.IMPELLER_DIAMETER;
import static stirwright.correlation.Dimensions.VESSEL_DIAMETER;

import stirwright.correlation.Constants;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Geometry;

/**
 * The turbulent power number Npmax of a paddle behind so many baffles that more would not raise it,
 * and how far the vessel's baffles are on the way there. B baffle width, nb baffles; other symbols
 * as in {@link FrictionFrame}.
 */
final class BafflePlateau {

    private static final double LEVEL = 8.3;
    private static final double BLADES = 0.7;
    private static final double UPRIGHTNESS = 0.9;
    private static final double SINE = 1.6;

    private static final double BAFFLES = 0.8;
    private static final double BAFFLES_UPRIGHTNESS = 0.72;
    private static final double BAFFLES_PLATEAU = 0.2;

    /** The published criterion of full baffling. */
    private static final double FULL = 0.44;

    private BafflePlateau() {}

    /** The level, with a slot for each constant of {@link #declareLevel}. */
    static String levelFormula(Blades blades) {
        return "Npmax = {b1}" + blades.onlyPitched(" (2 angle/pi)^{b3}") + " nB^{b2} W"
                + blades.onlyPitched(" sin(angle)^{b4}") + "/D";
    }

    static CorrelationBuilder declareLevel(CorrelationBuilder card, Blades blades) {
        card.constant("b1", LEVEL).constant("b2", BLADES);
        return blades == Blades.PITCHED ? card.constant("b3", UPRIGHTNESS).constant("b4", SINE) : card;
    }

    /** Npmax. */
    static double level(Geometry vessel, Blades blades, Constants k) {
        double upright = upright(vessel, k.get("b1"), k.get("b2"));
        return blades == Blades.PITCHED ? upright * pitch(vessel, k.get("b3"), k.get("b4")) : upright;
    }

    /** The baffles weighed against the impeller, with a slot for each constant of {@link #declareBaffling}. */
    static String bafflingFormula(Blades blades) {
        return "(B/T) nb^{c1}/(" + blades.onlyPitched("(2 angle/pi)^{c3} ") + "Npmax^{c2})";
    }

    static CorrelationBuilder declareBaffling(CorrelationBuilder card, Blades blades) {
        card.constant("c1", BAFFLES).constant("c2", BAFFLES_PLATEAU);
        return blades == Blades.PITCHED ? card.constant("c3", BAFFLES_UPRIGHTNESS) : card;
    }

    /** The value of {@link #bafflingFormula}. */
    static double baffling(Geometry vessel, Blades blades, double level, Constants k) {
        double upright = baffling(vessel, level, k.get("c1"), k.get("c2"));
        return blades == Blades.PITCHED ? upright / Math.pow(blades.uprightness(vessel), k.get("c3")) : upright;
    }

    /** The baffles of a pitched-blade turbine over those that the criterion asks for: full at 1 and above. */
    static double overFull(Geometry vessel) {
        double level = upright(vessel, LEVEL, BLADES) * pitch(vessel, UPRIGHTNESS, SINE);
        return baffling(vessel, level, BAFFLES, BAFFLES_PLATEAU)
                / (FULL * Math.pow(Blades.PITCHED.uprightness(vessel), BAFFLES_UPRIGHTNESS));
    }

    private static double upright(Geometry vessel, double level, double blades) {
        return level * Math.pow(vessel.get(BLADE_COUNT), blades) * vessel.ratio(BLADE_WIDTH, IMPELLER_DIAMETER);
    }

    private static double pitch(Geometry vessel, double uprightness, double sine) {
        return Math.pow(Blades.PITCHED.uprightness(vessel), uprightness) * Math.pow(Blades.PITCHED.sine(vessel), sine);
    }

    private static double baffling(Geometry vessel, double level, double baffles, double plateau) {
        return vessel.ratio(BAFFLE_WIDTH, VESSEL_DIAMETER) * Math.pow(vessel.get(BAFFLE_COUNT), baffles)
                / Math.pow(level, plateau);
    }
}
