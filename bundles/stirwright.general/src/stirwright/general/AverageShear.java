package stirwright.general;

import static stirwright.correlation.Dimensions.BLADE_WIDTH;
import static stirwright.correlation.Dimensions.IMPELLER_DIAMETER;
import static stirwright.correlation.Dimensions.VESSEL_DIAMETER;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Effect;
import stirwright.correlation.Geometry;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** Average shear rates near the impeller, which are not found by matching the power as Metzner and Otto's are. */
final class AverageShear {

    static final String BOWEN_FORMULA = "{a} (D/T)^{b} (D/W)";

    private AverageShear() {}

    static Correlation kellyGigas() {
        return Correlation.of("general.ks.kelly-gigas-2003", Quantity.SHEAR_RATE_CONSTANT, "Kelly and Gigas, near the impeller")
                .families("hydrofoil")
                .cite(Citation.withoutLocator("W. Kelly and B. Gigas, Chem. Eng. Sci. 58 (2003) 2141"))
                .transcription(Transcription.FROM_MEMORY)
                .notStated(Measure.REYNOLDS, "recalled as transitional, without numbers")
                .notStated(Classifier.BAFFLING, "recalled without it")
                .notStated(Measure.BLADE_COUNT, "recalled for an axial impeller; that it was a hydrofoil is less sure")
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .notStated(Classifier.FLUID, "made for power-law fluids; of which flow index is not recalled")
                .reads(Variable.SPEED)
                .constant("a", 33.1)
                .constant("b", 0.4)
                .formula("ks = {a} N^{b}, N in rev/s")
                .relation((vessel, k) -> {
                    double a = k.get("a");
                    double b = k.get("b");
                    return point -> a * Math.pow(point.get(Variable.SPEED), b);
                })
                .remark("The authors give the rate itself, 33.1 N^1.4 in 1/s. Their 33.1 has a dimension, so it belongs to "
                        + "their vessel and must not be taken to another scale.")
                .remark(notByPower("at 1 rev/s it is about three times the 10 found by matching the power"))
                .build();
    }

    static Correlation bowen() {
        return declareBowen(Correlation.of("general.ks.bowen-1986", Quantity.SHEAR_RATE_CONSTANT,
                        "Bowen, average near the impeller"), 4.2)
                .formula("ks = " + BOWEN_FORMULA)
                .relation((vessel, k) -> {
                    double ks = k.get("a") * bowenGroup(vessel, k.get("b"));
                    return point -> ks;
                })
                .remark(notByPower("at D/T 1/3 and W/D 1/5 it is 15.1, against 11.5 to 13 found by matching the power"))
                .build();
    }

    /** What Bowen's average and largest rate have in common; they differ in the constant. */
    static CorrelationBuilder declareBowen(CorrelationBuilder card, double a) {
        return card.families("discturbine")
                .cite(Citation.withoutLocator("R. L. Bowen, Chem. Eng. (1986)"))
                .transcription(Transcription.FROM_MEMORY)
                .notStated(Measure.REYNOLDS, "recalled without a range")
                .notStated(Classifier.BAFFLING, "recalled without it")
                .notStated(Measure.BLADE_COUNT, "recalled for radial turbines, without it")
                .notStated(Measure.W_OVER_D, "recalled without a range, though the formula has it")
                .notStated(Measure.D_OVER_T, "recalled without a range, though the formula has it")
                .notStated(Classifier.FLUID, "recalled without it")
                .contains(Effect.DIAMETER_RATIO)
                .constant("a", a)
                .constant("b", 0.3);
    }

    /** (D/T)^b D/W */
    static double bowenGroup(Geometry vessel, double b) {
        return Math.pow(vessel.ratio(IMPELLER_DIAMETER, VESSEL_DIAMETER), b) * vessel.ratio(IMPELLER_DIAMETER, BLADE_WIDTH);
    }

    private static String notByPower(String comparison) {
        return "Conflict: an average of local rates, not the one rate at which the power follows; " + comparison + ".";
    }
}
