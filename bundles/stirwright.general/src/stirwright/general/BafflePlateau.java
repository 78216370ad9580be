package stirwright.general;

import static stirwright.correlation.Dimensions.BAFFLE_COUNT;
import static stirwright.correlation.Dimensions.BAFFLE_WIDTH;
import static stirwright.correlation.Dimensions.BLADE_COUNT;
import static stirwright.correlation.Dimensions.BLADE_WIDTH;
import static stirwright.correlation.Dimensions.IMPELLER_DIAMETER;
import static stirwright.correlation.Dimensions.VESSEL_DIAMETER;

import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;
import stirwright.correlation.Constants;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Geometry;

/**
 * The turbulent power number Npmax of a paddle behind so many baffles that more would not raise it,
 * and how far the vessel's baffles are on the way there. B baffle width, nb baffles; other symbols
 * as in {@link FrictionFrame}.
 */
final class BafflePlateau {

    /**
     * The level's coefficients: b1 and b2 of the branch that all blades share, b3 and b4 of the angle,
     * b5 to b10 of a flat paddle's steeper branch below and flatter branch above the shared one.
     */
    private static final Map<String, Double> LEVEL = Map.of("b1", 8.3, "b2", 0.7, "b3", 0.9, "b4", 1.6,
            "b5", 10.0, "b6", 1.3, "b7", 0.54, "b8", 1.6, "b9", 10.0, "b10", 0.6);

    private static final double BAFFLES = 0.8;
    private static final double BAFFLES_UPRIGHTNESS = 0.72;
    private static final double BAFFLES_PLATEAU = 0.2;

    /** The published criterion of full baffling. */
    private static final double FULL = 0.44;

    private BafflePlateau() {}

    /** The level, with a slot for each constant of {@link #declareLevel}. */
    static String levelFormula(Blades blades) {
        return switch (blades) {
            case UPRIGHT, ARMS -> "Npmax = {b1} nB^{b2} W/D";
            case PITCHED -> "Npmax = {b1} (2 angle/pi)^{b3} nB^{b2} W sin(angle)^{b4}/D";
            case PADDLE -> "Npmax = {b5} S^{b6} up to S = {b7}, {b1} S up to S = {b8}, {b9} S^{b10} beyond; S = nB^{b2} W/D";
        };
    }

    static CorrelationBuilder declareLevel(CorrelationBuilder card, Blades blades) {
        List<String> names = switch (blades) {
            case UPRIGHT, ARMS -> List.of("b1", "b2");
            case PITCHED -> List.of("b1", "b2", "b3", "b4");
            case PADDLE -> List.of("b1", "b2", "b5", "b6", "b7", "b8", "b9", "b10");
        };
        names.forEach(name -> card.constant(name, LEVEL.get(name)));
        return card;
    }

    /** Npmax. */
    static double level(Geometry vessel, Blades blades, Constants k) {
        return level(vessel, blades, (ToDoubleFunction<String>) k::get);
    }

    private static double level(Geometry vessel, Blades blades, ToDoubleFunction<String> b) {
        double solidity = Math.pow(vessel.get(BLADE_COUNT), b.applyAsDouble("b2")) * vessel.ratio(BLADE_WIDTH, IMPELLER_DIAMETER);
        double shared = b.applyAsDouble("b1") * solidity;
        return switch (blades) {
            case UPRIGHT, ARMS -> shared;
            case PITCHED -> shared * Math.pow(blades.uprightness(vessel), b.applyAsDouble("b3"))
                    * Math.pow(blades.sine(vessel), b.applyAsDouble("b4"));
            case PADDLE -> solidity <= b.applyAsDouble("b7") ? b.applyAsDouble("b5") * Math.pow(solidity, b.applyAsDouble("b6"))
                    : solidity <= b.applyAsDouble("b8") ? shared
                    : b.applyAsDouble("b9") * Math.pow(solidity, b.applyAsDouble("b10"));
        };
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

    /** The baffles over those that the criterion asks for: full at 1 and above. */
    static double overFull(Geometry vessel, Blades blades) {
        return baffling(vessel, level(vessel, blades, LEVEL::get), BAFFLES, BAFFLES_PLATEAU)
                / (FULL * Math.pow(blades.uprightness(vessel), BAFFLES_UPRIGHTNESS));
    }

    private static double baffling(Geometry vessel, double level, double baffles, double plateau) {
        return vessel.ratio(BAFFLE_WIDTH, VESSEL_DIAMETER) * Math.pow(vessel.get(BAFFLE_COUNT), baffles)
                / Math.pow(level, plateau);
    }
}
