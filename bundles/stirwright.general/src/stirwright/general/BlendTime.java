package stirwright.general;

import static stirwright.correlation.Dimensions.IMPELLER_DIAMETER;
import static stirwright.correlation.Dimensions.LIQUID_HEIGHT;
import static stirwright.correlation.Dimensions.VESSEL_DIAMETER;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.FluidClass;
import stirwright.correlation.Geometry;
import stirwright.correlation.Measure;
import stirwright.correlation.OperatingPoint;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** Grenville's time to 95 % homogeneity, from the power number. */
final class BlendTime {

    /** Np^(1/3) Re, by which the regimes are told apart. */
    private static final Measure POWERED_REYNOLDS = Measure.of("powered_reynolds", "Np^(1/3) Re",
            (vessel, point) -> poweredReynolds(point)).byFactor();

    private static final double TURBULENT_FROM = 6370;

    private BlendTime() {}

    static Correlation turbulent() {
        return grenville("general.blend-time.grenville-1992-turbulent", "Grenville, turbulent")
                .scatter(0.10)
                .atLeast(POWERED_REYNOLDS, TURBULENT_FROM)
                .reads(Variable.POWER_NUMBER, Variable.SPEED)
                .constant("a", 5.2)
                .formula("t95 = {a} T^1.5 H^0.5/(Np^(1/3) N D^2)")
                .relation((vessel, k) -> {
                    double numerator = k.get("a") * turns(vessel);
                    return point -> numerator
                            / (Math.cbrt(point.get(Variable.POWER_NUMBER)) * point.get(Variable.SPEED));
                })
                .remark("Conflict: Nienow (1997) has t95 = 5.9 T^(2/3) eps^(-1/3) (D/T)^(-1/3), 4.6 % more at H = T.")
                .build();
    }

    static Correlation transitional() {
        return grenville("general.blend-time.grenville-1992-transitional", "Grenville, transitional")
                .scatter(0.17)
                .atMost(POWERED_REYNOLDS, TURBULENT_FROM)
                .reads(Variable.POWER_NUMBER, Variable.REYNOLDS, Variable.SPEED)
                .constant("a", 183)
                .formula("t95 = ({a}/(Np^(1/3) Re))^2 rho T^1.5 H^0.5/mu, rho/mu = Re/(N D^2)")
                .relation((vessel, k) -> {
                    double a = k.get("a");
                    double turns = turns(vessel);
                    return point -> {
                        double share = a / poweredReynolds(point);
                        return share * share * point.reynolds() * turns / point.get(Variable.SPEED);
                    };
                })
                .build();
    }

    private static CorrelationBuilder grenville(String id, String title) {
        return Correlation.of(id, Quantity.BLEND_TIME, title)
                .anyFamily()
                .cite(Citation.withoutLocator("R. K. Grenville, Blending of viscous Newtonian and pseudo-plastic fluids, "
                        + "PhD thesis, Cranfield Institute of Technology (1992), constants as printed after the Handbook of "
                        + "Industrial Mixing, Wiley (2004)"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .range(Measure.REYNOLDS, 200, 1e5)
                .notStated(Classifier.BAFFLING, "the abstract does not say")
                .range(Measure.D_OVER_T, 0.33, 0.5)
                .nominal(Measure.C_OVER_T, 1.0 / 3)
                .notStated(Measure.H_OVER_T, "recalled as up to 1, unsure")
                .fluids(FluidClass.NEWTONIAN)
                .remark("The source covers pseudoplastic fluids too, with the viscosity at the vessel wall in place of "
                        + "that at the average shear rate; the Reynolds number here is by the latter, so other fluids are "
                        + "left out.")
                .remark("Measured in vessels of 0.30, 0.61 and 1.83 m with four impellers. The scatter is from memory.");
    }

    private static double poweredReynolds(OperatingPoint point) {
        return Math.cbrt(point.get(Variable.POWER_NUMBER)) * point.reynolds();
    }

    /** T^1.5 H^0.5/D^2 */
    private static double turns(Geometry vessel) {
        double t = vessel.get(VESSEL_DIAMETER);
        double d = vessel.get(IMPELLER_DIAMETER);
        return t * Math.sqrt(t * vessel.get(LIQUID_HEIGHT)) / (d * d);
    }
}
