package stirwright.general;

import static stirwright.correlation.Dimensions.BLADE_WIDTH;
import static stirwright.correlation.Dimensions.IMPELLER_DIAMETER;
import static stirwright.correlation.Dimensions.LIQUID_HEIGHT;
import static stirwright.correlation.Dimensions.VESSEL_DIAMETER;

import stirwright.correlation.Constants;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Geometry;

/**
 * Nagata's equations for a paddle of two blades without baffles, bound to a vessel: a laminar branch
 * A/Re and a turbulent one that falls from the level B by the power p of a bracket of the Reynolds
 * number. D impeller diameter, T vessel diameter, H liquid height, W blade width.
 */
final class NagataCurve {

    private final double laminar;
    private final double level;
    private final double power;
    private final double start;
    private final double upper;
    private final double lower;
    private final double steepness;

    NagataCurve(Geometry vessel, Blades blades, Constants k) {
        double d = vessel.ratio(IMPELLER_DIAMETER, VESSEL_DIAMETER);
        double w = vessel.ratio(BLADE_WIDTH, VESSEL_DIAMETER);
        double h = vessel.ratio(LIQUID_HEIGHT, VESSEL_DIAMETER);
        laminar = k.get("a1") + w * (k.get("a2") * square(d - k.get("a3")) + k.get("a4"));
        double upright = Math.pow(10, k.get("b1") - k.get("b2") * square(w - k.get("b3")) - k.get("b4") * d)
                * Math.pow(h, k.get("h") + w);
        level = blades == Blades.PITCHED ? upright * Math.pow(blades.sine(vessel), k.get("s")) : upright;
        power = k.get("p1") + k.get("p2") * w - k.get("p3") * square(d - k.get("p4")) - k.get("p5") * square(square(w));
        start = k.get("c1");
        upper = k.get("c2");
        lower = k.get("c3");
        steepness = k.get("c4");
    }

    /** The equations after "Np = ", with a slot for each constant of {@link #declare}. */
    static String formula(Blades blades, String reynolds) {
        String power = reynolds + "^{c4}";
        return "A/" + reynolds + " + B (({c1} + {c2} " + power + ")/({c1} + {c3} " + power + "))^p (H/T)^({h} + W/T)"
                + blades.onlyPitched(" sin(angle)^{s}") + "; "
                + "A = {a1} + (W/T)({a2} (D/T - {a3})^2 + {a4}); "
                + "B = 10^({b1} - {b2} (W/T - {b3})^2 - {b4} D/T); "
                + "p = {p1} + {p2} W/T - {p3} (D/T - {p4})^2 - {p5} (W/T)^4";
    }

    static CorrelationBuilder declare(CorrelationBuilder card, Blades blades) {
        card.constant("a1", 14).constant("a2", 670).constant("a3", 0.6).constant("a4", 185)
                .constant("b1", 1.3).constant("b2", 4).constant("b3", 0.5).constant("b4", 1.14)
                .constant("c1", 1000).constant("c2", 1.2).constant("c3", 3.2).constant("c4", 0.66)
                .constant("p1", 1.1).constant("p2", 4).constant("p3", 2.5).constant("p4", 0.5).constant("p5", 7)
                .constant("h", 0.35);
        return blades == Blades.PITCHED ? card.constant("s", 1.2) : card;
    }

    /** The power number without baffles at an impeller Reynolds number. */
    double powerNumber(double reynolds) {
        double rise = Math.pow(reynolds, steepness);
        return laminar / reynolds + level * Math.pow((start + upper * rise) / (start + lower * rise), power);
    }

    private static double square(double x) {
        return x * x;
    }
}
