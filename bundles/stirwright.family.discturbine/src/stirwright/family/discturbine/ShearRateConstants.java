package stirwright.family.discturbine;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.FluidClass;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;

/** Average shear rate over speed, per revolution. */
final class ShearRateConstants {

    private static final String TRANSITION_ENDS =
            "Metzner and Otto's abstract says laminar and transition regions; the end of the transition is the "
            + "family's limit, not theirs.";

    private ShearRateConstants() {}

    static Correlation metznerOtto() {
        return Correlation.of("discturbine.ks.metzner-otto-1957", Quantity.SHEAR_RATE_CONSTANT, "Metzner and Otto")
                .families(DiscTurbine.ID, "flatblade")
                .cite(Citation.withoutLocator("A. B. Metzner and R. E. Otto, AIChE J. 3 (1957) 3-10; the value as "
                        + "quoted by J. Wu, L. J. Graham and N. Noui-Mehidi, AIChE J. 52 (2006) 2323-2332"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .atMost(Measure.REYNOLDS, RegimeLimits.IN_GENERAL.turbulentFrom())
                .notStated(Classifier.BAFFLING, "the abstract does not say")
                .notStated(Measure.BLADE_COUNT, "the abstract says flat-bladed turbines")
                .notStated(Measure.D_OVER_T, "the abstract has D 2 to 8 in and T 6 to 22 in, no ratio")
                .notStated(Classifier.FLUID, "the abstract says three non-Newtonian fluids, not of which kind")
                .value("ks", 13)
                .remark(TRANSITION_ENDS)
                .remark("Measured on the scale of D 0.05 to 0.20 m in T 0.15 to 0.56 m; being a ratio of rates the "
                        + "constant is used on other scales as well.")
                .remark("Conflict: four years later the first author had 11.5 plus or minus 1.5.")
                .build();
    }

    static Correlation metzner() {
        return metzner("discturbine.ks.metzner-1961", "Metzner et al.")
                .families("flatblade")
                .scatter(0.13)
                .baffled()
                .oneOf(Measure.BAFFLE_COUNT, 4)
                .range(Measure.D_OVER_T, 0.182, 0.769)
                .remark("Plus or minus 1.5, T/D 1.3 to 5.5, D 0.05 to 0.20 m.")
                .remark("Conflict: Metzner and Otto (1957) have 13.")
                .build();
    }

    static Correlation metznerTwo() {
        return metzner("discturbine.ks.metzner-1961-two", "Metzner et al., two turbines")
                .oneOf(Measure.IMPELLER_COUNT, 2)
                .scatter(0.122)
                .notStated(Classifier.BAFFLING, "recalled without it")
                .nominal(Measure.D_OVER_T, 0.2857)
                .remark("Plus or minus 1.4, T/D 3.5.")
                .build();
    }

    /** The same constant for one turbine and for two. */
    private static CorrelationBuilder metzner(String id, String title) {
        return Correlation.of(id, Quantity.SHEAR_RATE_CONSTANT, title)
                .families(DiscTurbine.ID)
                .cite(Citation.withoutLocator("A. B. Metzner, R. H. Feehs, H. L. Ramos, R. E. Otto and J. D. Tuthill, "
                        + "AIChE J. 7 (1961) 3-9"))
                .transcription(Transcription.FROM_MEMORY)
                .atMost(Measure.REYNOLDS, RegimeLimits.IN_GENERAL.turbulentFrom())
                .oneOf(Measure.BLADE_COUNT, 6)
                .notStated(Classifier.FLUID, "recalled for non-Newtonian fluids, not of which kind")
                .value("ks", 11.5)
                .remark(TRANSITION_ENDS + " The constant is defined by their procedure.");
    }

    static Correlation shearThickening() {
        return Correlation.of("discturbine.ks.calderbank-moo-young-thickening", Quantity.SHEAR_RATE_CONSTANT,
                        "Calderbank and Moo-Young, shear-thickening fluids")
                .families(DiscTurbine.ID)
                .cite(Citation.withoutLocator(
                        "P. H. Calderbank and M. B. Moo-Young, Trans. Instn Chem. Engrs 37 (1959) 26-33"))
                .transcription(Transcription.FROM_MEMORY)
                .notStated(Measure.REYNOLDS, "recalled without a range")
                .notStated(Classifier.BAFFLING, "recalled without it")
                .notStated(Measure.BLADE_COUNT, "recalled for turbines")
                .notStated(Measure.D_OVER_T, "recalled without a range, though the formula has it")
                .fluids(FluidClass.SHEAR_THICKENING)
                .contains(Effect.DIAMETER_RATIO)
                .constant("a", 12.8)
                .constant("b", 0.5)
                .formula("ks = {a} (D/T)^{b}")
                .relation((vessel, k) -> {
                    double ks = k.get("a") * Math.pow(
                            vessel.ratio(Dimensions.IMPELLER_DIAMETER, Dimensions.VESSEL_DIAMETER), k.get("b"));
                    return point -> ks;
                })
                .build();
    }
}
