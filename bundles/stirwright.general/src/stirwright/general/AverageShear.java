package stirwright.general;

import static stirwright.correlation.Dimensions.BLADE_WIDTH;
import static stirwright.correlation.Dimensions.IMPELLER_DIAMETER;
import static stirwright.correlation.Dimensions.VESSEL_DIAMETER;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Effect;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/**
 * Average shear rates near the impeller. They are no shear-rate constants in Metzner and Otto's sense,
 * since they are not found by matching the power, and so they are a quantity of their own.
 */
final class AverageShear {

    private static final Quantity NEAR_IMPELLER =
            Quantity.of("impeller-shear-rate", "average shear rate near the impeller", "gimp", "1/s");

    private AverageShear() {}

    static Correlation kellyGigas() {
        return Correlation.of("general.impeller-shear.kelly-gigas-2003", NEAR_IMPELLER, "Kelly and Gigas, axial impeller")
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
                .constant("b", 1.4)
                .formula("gimp = {a} N^{b}, N in rev/s")
                .relation((vessel, k) -> {
                    double a = k.get("a");
                    double b = k.get("b");
                    return point -> a * Math.pow(point.get(Variable.SPEED), b);
                })
                .remark("The constant has a dimension, so it belongs to the authors' vessel and must not be taken to another "
                        + "scale.")
                .remark(notByPower("at 1 rev/s it is about three times the 10 per second that match the power"))
                .build();
    }

    static Correlation bowen() {
        return declareBowen(Correlation.of("general.impeller-shear.bowen-1986", NEAR_IMPELLER,
                        "Bowen, radial turbine"), "gimp", 4.2)
                .remark(notByPower("at D/T 1/3 and W/D 1/5 it is 15.1 N, against 11.5 N to 13 N that match the power"))
                .build();
    }

    /** Bowen's average and largest rate; they differ in the constant. */
    static CorrelationBuilder declareBowen(CorrelationBuilder card, String symbol, double a) {
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
                .reads(Variable.SPEED)
                .constant("a", a)
                .constant("b", 0.3)
                .formula(symbol + " = {a} N (D/T)^{b} (D/W)")
                .relation((vessel, k) -> {
                    double perTurn = k.get("a") * vessel.ratio(IMPELLER_DIAMETER, BLADE_WIDTH)
                            * Math.pow(vessel.ratio(IMPELLER_DIAMETER, VESSEL_DIAMETER), k.get("b"));
                    return point -> perTurn * point.get(Variable.SPEED);
                });
    }

    private static String notByPower(String comparison) {
        return "Conflict: an average of local rates, not the one rate at which the power follows; " + comparison + ".";
    }
}
