package stirwright.general;

import static stirwright.correlation.Dimensions.BLADE_ANGLE;
import static stirwright.correlation.Dimensions.BLADE_WIDTH;
import static stirwright.correlation.Dimensions.IMPELLER_COUNT;
import static stirwright.correlation.Dimensions.IMPELLER_DIAMETER;
import static stirwright.correlation.Dimensions.IMPELLER_HEIGHT;
import static stirwright.correlation.Dimensions.VESSEL_DIAMETER;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.Geometry;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/**
 * The shear-rate constant of a turning cylinder that takes the impeller's power: a power-law liquid
 * between it and the vessel flows as exact theory says, so Np Re^(power law) is known for every flow
 * index, and with it the constant that Metzner and Otto's procedure would find.
 */
final class CouetteAnalogy {

    private static final Measure HEIGHT =
            Measure.of("working_height_over_diameter", "h/D", (vessel, point) -> heightOverDiameter(vessel));

    private CouetteAnalogy() {}

    static Correlation constant() {
        return Correlation.of("general.ks.couette-analogy", Quantity.SHEAR_RATE_CONSTANT,
                        "Couette analogy, from the laminar power")
                .families("discturbine", "pitchedblade", "flatblade", "anchor", "helicalribbon")
                .cite(Citation.withoutLocator("exact flow of a power-law liquid between a turning and a resting cylinder, "
                        + "worked here; the definition of the constant by F. Rieger and V. Novak, Trans. Instn Chem. "
                        + "Engrs 51 (1973) 105 and 52 (1974) 285"))
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .atMost(Measure.REYNOLDS, RegimeLimits.IN_GENERAL.laminarUpTo())
                .notStated(Classifier.BAFFLING, "the cylinders have none; in laminar flow baffles do not act")
                .notStated(Measure.D_OVER_T, "exact for the cylinders; the nearer the wall, the nearer to the impeller")
                .notStated(HEIGHT, "exact for the cylinders; for an open impeller a choice of ours")
                .notStated(Measure.FLOW_INDEX, "exact for every power law")
                .notStated(Classifier.FLUID, "exact for power-law fluids; for others the local flow index is used, an "
                        + "extension of ours")
                .reads(Variable.LAMINAR_POWER, Variable.FLOW_INDEX)
                .formula("ks = (Kp(n)/Kp)^(1/(n - 1)); Kp(n) = pi^2 (De/D)^2 (h/D) (4 pi/(n (1 - (De/T)^(2/n))))^n; "
                        + "(D/De)^2 = 4 pi^3 (h/D)/Kp + (D/T)^2, so that Kp(1) = Kp = Np Re in laminar flow; h impeller height, "
                        + "of a turbine the height of its blades, of all impellers together")
                .relation((vessel, k) -> {
                    double tOverD = vessel.ratio(VESSEL_DIAMETER, IMPELLER_DIAMETER);
                    double fullGap = 4 * Math.pow(Math.PI, 3) * heightOverDiameter(vessel) * tOverD * tOverD;
                    return point -> constant(
                            Math.log1p(fullGap / point.get(Variable.LAMINAR_POWER)), point.get(Variable.FLOW_INDEX));
                })
                .remark("A model and no measurement, so measured constants go first. Kp is that of the power number which "
                        + "would be picked for this vessel in laminar flow.")
                .remark("For a turbine h is a choice: 40 % more or less moves ks by about 15 % the other way. Near the wall h is "
                        + "plain, and the scatter of Kp, about 25 %, is what weighs.")
                .remark("It supports 11.5 for disc and 11 for pitched-blade turbines within 10 to 15 %, 20 to 28 for anchors at "
                        + "D/T 0.9 and 27 to 39 for ribbons.")
                .remark("Conflict: Metzner et al. (1961) have 11 plus or minus 5 for an anchor, Calderbank and Moo-Young "
                        + "(1961) twice the value here.")
                .remark("The shear rate at the inner cylinder is 4 pi N/(n (1 - (De/T)^(2/n))); the form with (T/De)^(2/n) - 1 "
                        + "is that at the resting wall. Neither is ks N.")
                .build();
    }

    /**
     * ks per revolution. With ln Kp(n) written out, ln ks is ln 4 pi less the slope of n ln n + n L(a/n)
     * from 1 to n, where L(x) = ln(1 - e^-x); the slope is taken term by term without a difference of
     * near numbers, so that no digits are lost towards n = 1.
     *
     * @param a ln (T/De)^2, above zero
     * @param n flow index
     */
    static double constant(double a, double n) {
        double fromNewtonian = n - 1;
        // The slopes at n = 1 are limits.
        double indexSlope = fromNewtonian == 0 ? 1 : n * Math.log1p(fromNewtonian) / fromNewtonian;
        double gapSlope = fromNewtonian == 0 ? -a / Math.expm1(a)
                : Math.log1p(-Math.expm1(a * fromNewtonian / n) / Math.expm1(a)) / fromNewtonian;
        return 4 * Math.PI * Math.exp(-indexSlope - Math.log(-Math.expm1(-a / n)) - gapSlope);
    }

    /** The height over which all impellers together work on the liquid, over the diameter. */
    private static double heightOverDiameter(Geometry vessel) {
        double height = vessel.get(IMPELLER_HEIGHT);
        if (Double.isNaN(height)) {
            double angle = vessel.get(BLADE_ANGLE);
            height = vessel.get(BLADE_WIDTH) * (Double.isNaN(angle) ? 1 : Math.sin(angle));
        }
        return vessel.get(IMPELLER_COUNT) * height / vessel.get(IMPELLER_DIAMETER);
    }
}
