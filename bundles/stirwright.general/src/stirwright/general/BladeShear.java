package stirwright.general;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.ReynoldsDefinition;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** The largest shear rate at the blades, which droplets and cells feel and the power does not tell. */
final class BladeShear {

    private static final Quantity BLADE_SHEAR_RATE =
            Quantity.of("blade-shear-rate", "largest shear rate at the blades", "gmax", "1/s");

    private BladeShear() {}

    static Correlation wichterle() {
        return turbineBlade("general.blade-shear.wichterle-1984", "Wichterle et al., power-law fluids")
                .cite(Citation.withoutLocator("K. Wichterle, M. Kadlec, L. Zak and P. Mitschka, Chem. Eng. Commun. 26 (1984) 25"))
                .notStated(Measure.FLOW_INDEX, "recalled without a range")
                .notStated(Classifier.FLUID, "made for power-law fluids; of which flow index is not recalled")
                .reynolds(ReynoldsDefinition.POWER_LAW)
                .reads(Variable.REYNOLDS, Variable.FLOW_INDEX, Variable.SPEED)
                .constant("a", 5.3)
                .formula("gmax = N (1 + {a} n)^(1/n) Re^(1/(1 + n)), Re = rho N^(2 - n) D^2/K")
                .relation((vessel, k) -> {
                    double a = k.get("a");
                    return point -> {
                        double n = point.get(Variable.FLOW_INDEX);
                        return point.get(Variable.SPEED) * Math.pow(1 + a * n, 1 / n)
                                * Math.pow(point.reynolds(), 1 / (1 + n));
                    };
                })
                .remark("For other than power-law fluids the local power law at the average shear rate is used; that is an "
                        + "extension of ours, and the blade's rate lies far above that average.")
                .remark("Conflict: for a Newtonian liquid it is 6.3 N Re^0.5, Robertson and Ulbrecht have 3.3 N Re^0.5.")
                .build();
    }

    static Correlation robertsonUlbrecht() {
        return turbineBlade("general.blade-shear.robertson-ulbrecht-1987", "Robertson and Ulbrecht")
                .cite(Citation.withoutLocator("B. Robertson and J. J. Ulbrecht (1987)"))
                .notStated(Classifier.FLUID, "written with a constant viscosity; recalled without the fluids measured")
                .reads(Variable.REYNOLDS, Variable.SPEED)
                .constant("a", 3.3)
                .constant("b", 0.5)
                .formula("gmax = {a} N Re^{b}")
                .relation((vessel, k) -> {
                    double a = k.get("a");
                    double b = k.get("b");
                    return point -> a * point.get(Variable.SPEED) * Math.pow(point.reynolds(), b);
                })
                .remark("The same as 3.3 N^1.5 D (rho/mu)^0.5; here with the viscosity at the average shear rate.")
                .remark("Conflict: Wichterle et al. have 6.3 in place of 3.3 for a Newtonian liquid.")
                .build();
    }

    static Correlation bowen() {
        return AverageShear.declareBowen(Correlation.of("general.blade-shear.bowen-1986", BLADE_SHEAR_RATE,
                        "Bowen, radial turbine"), "gmax", 9.7)
                .remark("Conflict: it does not know the viscosity, on which the two boundary-layer forms rest.")
                .build();
    }

    private static CorrelationBuilder turbineBlade(String id, String title) {
        return Correlation.of(id, BLADE_SHEAR_RATE, title)
                .families("discturbine")
                .transcription(Transcription.FROM_MEMORY)
                .notStated(Measure.REYNOLDS, "recalled without a range")
                .notStated(Classifier.BAFFLING, "recalled without it")
                .notStated(Measure.BLADE_COUNT, "recalled for turbine blades, without their number")
                .notStated(Measure.D_OVER_T, "recalled without a range");
    }
}
