package stirwright.family.anchor;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Standing;
import stirwright.correlation.Transcription;

/** Average shear rate over speed, per revolution, in laminar flow. */
final class ShearRateConstants {

    private ShearRateConstants() {}

    static Correlation becknerSmith() {
        return card("anchor.ks.beckner-smith-1966", "Beckner and Smith, by the wall gap", Anchors.ANCHOR)
                .cite(Sources.becknerSmith())
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .scatter(0.3)
                .notStated(Sources.GAP_OVER_T, "recalled without a range; compared with the Couette analogy from 0.024 to 0.05")
                .notStated(Classifier.FLUID, "recalled for power-law fluids, not of which flow index")
                .constant("a", 37)
                .constant("b", 120)
                .formula("ks = {a} - {b} c/T")
                .relation((vessel, k) -> {
                    double ks = k.get("a")
                            - k.get("b") * vessel.ratio(Dimensions.WALL_GAP, Dimensions.VESSEL_DIAMETER);
                    return point -> ks;
                })
                .remark("Recalled within about 30 %: 34.1 at c/T 0.024 where the Couette analogy gives 33.7, 31 at 0.05 where "
                        + "it gives 23 to 28. A factor (1 - n), sometimes quoted with it, contradicts both and is left out.")
                .remark("Conflict: Metzner et al. (1961) have 11 plus or minus 5; Calderbank and Moo-Young (1961) 45 at D/T 0.9.")
                .build();
    }

    static Correlation metzner() {
        return card("anchor.ks.metzner-1961", "Metzner et al., an outlier", Anchors.ANCHOR)
                .cite(Citation.withoutLocator("A. B. Metzner, R. H. Feehs, H. L. Ramos, R. E. Otto and J. D. Tuthill, "
                        + "AIChE J. 7 (1961) 3-9"))
                .transcription(Transcription.FROM_MEMORY)
                .scatter(0.455)
                .standing(Standing.RETIRED)
                .nominal(Measure.D_OVER_T, 1 / 1.02)
                .notStated(Classifier.FLUID, "recalled for non-Newtonian fluids, not of which kind")
                .value("ks", 11)
                .remark("11 plus or minus 5 at T/D 1.02. Set aside here, not by its authors: it is shown and never used by itself.")
                .remark("Conflict: design practice has 20 to 25, and by the Couette analogy 11 does not go with an anchor's "
                        + "power: Kp 200 at D/T 0.9 asks for 23.")
                .build();
    }

    static Correlation designPractice() {
        return practice("anchor.ks.design-practice", "design practice", Anchors.ANCHOR)
                .transcription(Transcription.FROM_MEMORY)
                .remark("The Couette analogy gives 19 to 28 at D/T 0.9 for Kp 150 to 269.")
                .build();
    }

    static Correlation gate() {
        return practice("gate.ks.as-an-anchor", "as an anchor", Anchors.GATE)
                .transcription(Transcription.UNSURE)
                .build();
    }

    private static CorrelationBuilder practice(String id, String title, String family) {
        return card(id, title, family)
                .cite(Citation.commonPractice())
                .scatter(0.11)
                .notStated(Measure.D_OVER_T, "a rule of the trade without a range")
                .notStated(Classifier.FLUID, "a rule of the trade for non-Newtonian fluids")
                .value("ks", 22.5)
                .remark("The middle of 20 to 25.");
    }

    private static CorrelationBuilder card(String id, String title, String family) {
        return Correlation.of(id, Quantity.SHEAR_RATE_CONSTANT, title)
                .families(family)
                .noRoomForBaffles()
                .range(Measure.REYNOLDS, Double.NEGATIVE_INFINITY, Anchors.LAMINAR_UP_TO,
                        "laminar in words; the end of it is the family's limit");
    }
}
