package stirwright.general;

import static stirwright.correlation.Dimensions.BLADE_COUNT;
import static stirwright.correlation.Dimensions.IMPELLER_DIAMETER;
import static stirwright.correlation.Dimensions.LIQUID_HEIGHT;
import static stirwright.correlation.Dimensions.VESSEL_DIAMETER;

import stirwright.correlation.Constants;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Geometry;

/**
 * Kamei and Hiraoka's friction-factor equations for a paddle without baffles, bound to a vessel.
 *
 * <p>They treat the vessel like the gap between two cylinders: a friction factor f over a Reynolds
 * number ReG of the gap has a laminar branch CL/ReG and a turbulent branch that starts at Ct, bends
 * near ReG = sqrt(Ctr) and ends at the level finf. D impeller diameter, T vessel diameter, H liquid
 * height, W blade width (for an anchor h, the height of its arms), nB blades, angle of a blade to the
 * horizontal; beta, gamma, eta and X are pure numbers of the geometry.
 */
final class FrictionFrame {

    private final double powerPerFriction;
    private final double gapPerImpellerReynolds;
    private final double laminar;
    private final double turbulent;
    private final double transition;
    private final double level;
    private final double sharpness;

    FrictionFrame(Geometry vessel, Blades blades, Constants k) {
        double gap = Math.log(vessel.ratio(VESSEL_DIAMETER, IMPELLER_DIAMETER));
        double beta = beta(vessel, gap);
        double eta = eta(vessel, gap, k);
        double x = bladeGroup(vessel, blades, gamma(vessel, gap, beta, eta, k), k);
        double dOverT = vessel.ratio(IMPELLER_DIAMETER, VESSEL_DIAMETER);
        powerPerFriction = powerPerFriction(vessel, beta, k);
        gapPerImpellerReynolds = Math.PI * eta * gap * beta / (4 * dOverT);
        laminar = laminar(vessel, blades, eta, k);
        turbulent = capped(k.get("t1") * Math.pow(x, k.get("t2")), k.get("t3"), k.get("q"));
        sharpness = capped(k.get("m1") * Math.pow(x, k.get("m2")), k.get("m3"), k.get("q"));
        transition = transition(vessel, blades, x, k);
        double end = k.get("f1") * dOverT * Math.pow(turbulent, k.get("f2"));
        level = Math.pow(end / turbulent, 1 / sharpness);
    }

    /** The equations, with a slot for each constant of {@link #declare}. */
    static String formula(Blades blades) {
        String sine = blades.onlyPitched(" sin(angle)");
        String width = blades.widthSymbol();
        return "Np0 = {p} pi^4 beta^2/(8 D^3/(T^2 H)) f; "
                + "f = CL/ReG + Ct ((Ctr/ReG + ReG)^-1 + (finf/Ct)^(1/m))^m; "
                + "ReG = pi eta ln(T/D)/(4 D/(beta T)) Re; "
                + "CL = {l1} eta nB (D/H)(1 - (D/T)^2) + {l2} (" + width + sine + "/H)(nB/" + (sine.isEmpty() ? "2" : "(2" + sine + ")") + ")^(1/3); "
                + "Ct = (({t1} X^{t2})^-{q} + {t3}^-{q})^(-1/{q}); "
                + "m = (({m1} X^{m2})^-{q} + {m3}^-{q})^(-1/{q}); "
                + "Ctr = {r1} (D/T)^-{r2} (" + width + sine + "/T)^-{r3} X^-{r4}; "
                + "finf = {f1} (D/T) Ct^{f2}; "
                + "X = gamma nB^{x1} " + width + blades.onlyPitched(" sin(angle)^{x2}") + "/H; "
                + "gamma = (eta ln(T/D)/(beta T/D)^{g})^(1/3); "
                + "eta = {e1} ({e2} + (nB ln(T/D))^{e3})/(nB^{e4} (1 - (D/T)^2)); "
                + "beta = 2 ln(T/D)/(T/D - D/T)";
    }

    static CorrelationBuilder declare(CorrelationBuilder card, Blades blades) {
        card.constant("p", 1.2)
                .constant("l1", 0.215).constant("l2", 1.83)
                .constant("t1", 1.96).constant("t2", 1.19).constant("q", 7.8).constant("t3", 0.25)
                .constant("m1", 0.71).constant("m2", 0.373).constant("m3", 0.333)
                .constant("r1", 23.8).constant("r2", 3.24).constant("r3", 1.18).constant("r4", 0.74)
                .constant("f1", 0.0151).constant("f2", 0.308)
                .constant("x1", 0.7).constant("g", 5)
                .constant("e1", 0.711).constant("e2", 0.157).constant("e3", 0.611).constant("e4", 0.52);
        return blades == Blades.PITCHED ? card.constant("x2", 1.6) : card;
    }

    /** The power number without baffles at an impeller Reynolds number. */
    double powerNumber(double reynolds) {
        double gap = gapPerImpellerReynolds * reynolds;
        double friction = laminar / gap
                + turbulent * Math.pow(1 / (transition / gap + gap) + level, sharpness);
        return powerPerFriction * friction;
    }

    private static double beta(Geometry vessel, double gap) {
        double tOverD = vessel.ratio(VESSEL_DIAMETER, IMPELLER_DIAMETER);
        return 2 * gap / (tOverD - 1 / tOverD);
    }

    private static double eta(Geometry vessel, double gap, Constants k) {
        double blades = vessel.get(BLADE_COUNT);
        double dOverT = vessel.ratio(IMPELLER_DIAMETER, VESSEL_DIAMETER);
        return k.get("e1") * (k.get("e2") + Math.pow(blades * gap, k.get("e3")))
                / (Math.pow(blades, k.get("e4")) * (1 - dOverT * dOverT));
    }

    private static double gamma(Geometry vessel, double gap, double beta, double eta, Constants k) {
        double tOverD = vessel.ratio(VESSEL_DIAMETER, IMPELLER_DIAMETER);
        return Math.cbrt(eta * gap / Math.pow(beta * tOverD, k.get("g")));
    }

    /** X: the blades' share of the liquid height. */
    private static double bladeGroup(Geometry vessel, Blades blades, double gamma, Constants k) {
        double upright = gamma * Math.pow(vessel.get(BLADE_COUNT), k.get("x1"))
                * blades.width(vessel) / vessel.get(LIQUID_HEIGHT);
        return blades == Blades.PITCHED ? upright * Math.pow(blades.sine(vessel), k.get("x2")) : upright;
    }

    private static double powerPerFriction(Geometry vessel, double beta, Constants k) {
        double d = vessel.get(IMPELLER_DIAMETER);
        double t = vessel.get(VESSEL_DIAMETER);
        return k.get("p") * Math.pow(Math.PI, 4) * beta * beta * t * t * vessel.get(LIQUID_HEIGHT) / (8 * d * d * d);
    }

    private static double laminar(Geometry vessel, Blades blades, double eta, Constants k) {
        double count = vessel.get(BLADE_COUNT);
        double sine = blades.sine(vessel);
        double dOverT = vessel.ratio(IMPELLER_DIAMETER, VESSEL_DIAMETER);
        return k.get("l1") * eta * count * vessel.ratio(IMPELLER_DIAMETER, LIQUID_HEIGHT) * (1 - dOverT * dOverT)
                + k.get("l2") * blades.width(vessel) / vessel.get(LIQUID_HEIGHT) * sine * Math.cbrt(count / (2 * sine));
    }

    private static double transition(Geometry vessel, Blades blades, double x, Constants k) {
        double dOverT = vessel.ratio(IMPELLER_DIAMETER, VESSEL_DIAMETER);
        double projected = blades.width(vessel) / vessel.get(VESSEL_DIAMETER) * blades.sine(vessel);
        return k.get("r1") * Math.pow(dOverT, -k.get("r2")) * Math.pow(projected, -k.get("r3"))
                * Math.pow(x, -k.get("r4"));
    }

    /** Rises with the value and levels off below the cap. */
    private static double capped(double value, double cap, double q) {
        return Math.pow(Math.pow(value, -q) + Math.pow(cap, -q), -1 / q);
    }
}
