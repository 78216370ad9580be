package stirwright.family.helicalribbon;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** Average shear rate over speed, per revolution, in laminar flow. */
final class ShearRateConstants {

    private ShearRateConstants() {}

    static Correlation nagata() {
        return Sources.laminar("helicalribbon.ks.nagata-1971", Quantity.SHEAR_RATE_CONSTANT, "Nagata et al.")
                .cite(Citation.of("S. Nagata et al., J. Chem. Eng. Japan 4 (1971)", "p. 72"))
                .transcription(Transcription.FROM_MEMORY)
                .scatter(0.17)
                .notStated(Sources.GAP_OVER_D, "recalled without a range")
                .notStated(Sources.RIBBON_COUNT, "recalled without it")
                .notStated(Classifier.FLUID, "recalled for non-Newtonian fluids, not of which kind")
                .value("ks", 30)
                .remark("Reported are 25 to 35. Shamlou and Edwards's form gives 31.0 at c/D 0.026; the Couette analogy 27 to 39 for "
                        + "Kp 250 to 357.")
                .build();
    }

    static Correlation shamlouEdwards() {
        return Sources.laminar("helicalribbon.ks.shamlou-edwards-1985", Quantity.SHEAR_RATE_CONSTANT,
                        "Shamlou and Edwards, by the wall gap")
                .cite(Citation.withoutLocator("P. A. Shamlou and M. F. Edwards, Chem. Eng. Sci. 40 (1985) 1773-1781"))
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .notStated(Sources.GAP_OVER_D, "no range is recalled; compared with others at 0.026")
                .notStated(Sources.RIBBON_COUNT, "recalled without it")
                .range(Measure.FLOW_INDEX, 0.5, 1)
                .notStated(Classifier.FLUID, "recalled for flow indices, not for a kind of fluid")
                .constant("a", 34)
                .constant("b", 114)
                .formula("ks = {a} - {b} c/D")
                .relation((vessel, k) -> {
                    double ks = k.get("a")
                            - k.get("b") * vessel.ratio(Dimensions.WALL_GAP, Dimensions.IMPELLER_DIAMETER);
                    return point -> ks;
                })
                .remark("Recalled; 31.0 at c/D 0.026 agrees with 30 (Nagata et al.).")
                .build();
    }
}
