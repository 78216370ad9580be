package stirwright.general;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** Calderbank and Moo-Young's shear-rate constants, which depend on the flow index. */
final class CalderbankMooYoung {

    /** T/D 1.4, to three figures. */
    private static final double LEAST_ANCHOR = 0.714;

    private CalderbankMooYoung() {}

    static Correlation turbine() {
        return Correlation.of("general.ks.calderbank-moo-young-turbine", Quantity.SHEAR_RATE_CONSTANT,
                        "Calderbank and Moo-Young, turbines")
                .families("discturbine", "pitchedblade", "flatblade", "propeller")
                .cite(Citation.withoutLocator("P. H. Calderbank and M. B. Moo-Young, Trans. Instn Chem. Engrs 37 (1959) "
                        + "26-33 and 39 (1961) 337-347"))
                .transcription(Transcription.FROM_MEMORY)
                .scatter(0.10)
                .notStated(Measure.REYNOLDS, "recalled without a range")
                .notStated(Classifier.BAFFLING, "recalled without it")
                .notStated(Measure.BLADE_COUNT, "recalled for turbines and propellers")
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .notStated(Measure.FLOW_INDEX, "recalled without a range")
                .notStated(Classifier.FLUID, "made for power-law fluids; of which flow index is not recalled")
                .reads(Variable.FLOW_INDEX)
                .constant("B", 11)
                .formula("ks = {B} (4 n/(3 n + 1))^(n/(1 - n))")
                .relation((vessel, k) -> {
                    double b = k.get("B");
                    return point -> b * factor(point.get(Variable.FLOW_INDEX));
                })
                .remark("It goes with the plain apparent viscosity, stress over shear rate; with the viscosity "
                        + "K((3n + 1)/(4n))^n and ks = 11 the same result would be counted twice.")
                .remark("For other than power-law fluids the local flow index at the average shear rate is used; that "
                        + "is an extension of ours.")
                .remark("For shear-thickening fluids the authors have a form of their own with (D/T)^0.5.")
                .build();
    }

    static Correlation anchor() {
        return Correlation.of("general.ks.calderbank-moo-young-anchor", Quantity.SHEAR_RATE_CONSTANT,
                        "Calderbank and Moo-Young, anchor, disputed")
                .families("anchor")
                .cite(Citation.withoutLocator(
                        "P. H. Calderbank and M. B. Moo-Young, Trans. Instn Chem. Engrs 39 (1961) 337-347"))
                .transcription(Transcription.UNSURE)
                .notStated(Measure.REYNOLDS, "recalled without a range")
                .notStated(Classifier.BAFFLING, "recalled without it")
                .atLeast(Measure.D_OVER_T, LEAST_ANCHOR)
                .notStated(Measure.FLOW_INDEX, "recalled without a range")
                .notStated(Classifier.FLUID, "made for power-law fluids; of which flow index is not recalled")
                .reads(Variable.FLOW_INDEX)
                .constant("a", 9.5)
                .constant("b", 9)
                .formula("ks = ({a} + {b} (T/D)^2/((T/D)^2 - 1)) (4 n/(3 n + 1))^(n/(1 - n))")
                .relation((vessel, k) -> {
                    double dOverT = vessel.ratio(Dimensions.IMPELLER_DIAMETER, Dimensions.VESSEL_DIAMETER);
                    double b = k.get("a") + k.get("b") / (1 - dOverT * dOverT);
                    return point -> b * factor(point.get(Variable.FLOW_INDEX));
                })
                .remark("Recalled for T/D below 1.4.")
                .remark("Conflict: Beckner and Smith's 37 - 120 c/T and the Couette analogy both give about half of it: 31 and "
                        + "28 against 45 at D/T 0.9.")
                .build();
    }

    /** (4n/(3n+1))^(n/(1-n)); at n = 1 the limit exp(-1/4), approached without loss of digits. */
    static double factor(double n) {
        double fromNewtonian = 1 - n;
        if (fromNewtonian == 0) {
            return Math.exp(-0.25);
        }
        // 4n/(3n+1) = 1 - (1-n)/(3n+1)
        return Math.exp(n * Math.log1p(-fromNewtonian / (3 * n + 1)) / fromNewtonian);
    }
}
