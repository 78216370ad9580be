package stirwright.family.discturbine;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Figures;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** How the turbulent power number goes with the count of blades, their width, and the width of baffles. */
final class Trends {

    private static final double STANDARD_BLADES = 6;
    private static final double TURBULENT = RegimeLimits.IN_GENERAL.turbulentFrom();

    private Trends() {}

    static Correlation bladeCount() {
        return Correlation.modifier("discturbine.np.bates-blade-count", Quantity.POWER_NUMBER, Effect.BLADE_COUNT,
                        "other than six blades, Bates et al.")
                .families(DiscTurbine.ID)
                .appliesWhen("other than six blades", vessel -> vessel.get(Dimensions.BLADE_COUNT) != STANDARD_BLADES)
                .cite(Sources.bates())
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .notStated(Measure.REYNOLDS, "recalled for turbulent flow; below it the factor is 1, as Rushton's table at "
                        + "Re 5 has it")
                .notStated(Classifier.BAFFLING, "recalled without it")
                .atLeast(Measure.BLADE_COUNT, 3)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .newtonianData()
                .reads(Variable.REYNOLDS)
                .constant("a", 0.8)
                .constant("b", 0.7)
                .formula("(nB/6)^{a} up to 6 blades, (nB/6)^{b} above, from Re " + Figures.show(TURBULENT) + " on; 1 below")
                .relation((vessel, k) -> {
                    double blades = vessel.get(Dimensions.BLADE_COUNT) / STANDARD_BLADES;
                    double factor = Math.pow(blades, k.get(blades > 1 ? "b" : "a"));
                    return point -> point.reynolds() >= TURBULENT ? factor : 1;
                })
                .remark("Exponents vary by source. Checked with Rushton's table of 1950, which has 4.3, 6.0 and 9.9 for 4, "
                        + "6 and 12 blades: within 2 %.")
                .remark("A number that was measured with six blades stays excluded with others; this corrects it.")
                .remark("For the width of blades the same authors and others have exponents from 1.0 to 1.45, too far apart "
                        + "for a factor.")
                .build();
    }

    static Correlation furukawa() {
        return turbulentBaffled("discturbine.np.furukawa-2012", "Furukawa et al., full baffling")
                .cite(Citation.withoutLocator("H. Furukawa, Y. Kato, Y. Inoue, T. Kato, Y. Tada and S. Hashimoto, Int. J. "
                        + "Chem. Eng. 2012, Article 106496"))
                .notStated(Measure.BLADE_COUNT, "recalled without a range")
                .notStated(Measure.W_OVER_D, "recalled without a range")
                .notStated(Measure.B_OVER_T, "so wide that wider ones would not raise the power")
                .contains(Effect.BLADE_COUNT, Effect.BAFFLES)
                .constant("a", 10)
                .constant("b", 0.7)
                .constant("e", 1.3)
                .formula("Np = {a} (nB^{b} W/D)^{e}")
                .relation((vessel, k) -> {
                    double np = k.get("a") * Math.pow(Math.pow(vessel.get(Dimensions.BLADE_COUNT), k.get("b"))
                            * vessel.ratio(Dimensions.BLADE_WIDTH, Dimensions.IMPELLER_DIAMETER), k.get("e"));
                    return point -> np;
                })
                .remark("Six blades of D/5: 6.3, above the 5 to 6 of most tables.")
                .build();
    }

    static Correlation baffleWidth() {
        return turbulentBaffled("discturbine.np.rushton-1950-baffle-width", "Rushton et al., width of baffles")
                .cite(Sources.rushton("figure as printed in D. W. Hendricks, Fundamentals of Water Treatment Unit Processes, "
                        + "CRC Press, Fig. 10.15; there the axes and widths were read, the levels are recalled"))
                .oneOf(Measure.BLADE_COUNT, 6)
                .notStated(Measure.BAFFLE_COUNT, "not read in the figure")
                .range(Measure.B_OVER_T, 0.04, 0.17)
                .contains(Effect.BAFFLES)
                .curve("Np", 0.04, 4.4, 0.1, 5.75, 0.17, 6.15)
                .formula("Np over B/T {Np}")
                .relation((vessel, k) -> {
                    double np = k.curve("Np").at(
                            vessel.ratio(Dimensions.BAFFLE_WIDTH, Dimensions.VESSEL_DIAMETER));
                    return point -> np;
                })
                .remark("Levels recalled as about 4.4, 5.5 to 6 and 6 to 6.3; the middles are taken.")
                .build();
    }

    private static CorrelationBuilder turbulentBaffled(String id, String title) {
        return Correlation.of(id, Quantity.POWER_NUMBER, title)
                .families(DiscTurbine.ID)
                .transcription(Transcription.UNSURE)
                .turbulent()
                .baffled()
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .newtonianData();
    }
}
