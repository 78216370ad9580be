package stirwright.family.anchor;

import stirwright.correlation.Citation;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** Power numbers of anchor and gate beside the anchor's as a high paddle. */
final class PowerNumbers {

    private PowerNumbers() {}

    static Correlation mccabeLaminar() {
        return card("anchor.np.mccabe-laminar", "McCabe, Smith and Harriott, laminar", Anchors.ANCHOR)
                .cite(Sources.mccabe())
                .transcription(Transcription.FROM_MEMORY)
                .atMost(Measure.REYNOLDS, RegimeLimits.IN_GENERAL.laminarUpTo())
                .notStated(Sources.GAP_OVER_D, "the table has no column for it")
                .overReynolds("KL", 300)
                .remark("The table's heading has four baffles of a tenth of the vessel, which cannot be meant for an anchor.")
                .remark("The paddle's equations give 269 at D/T 0.9 and 354 at 0.95 for h = D; other tables have 200 to 300.")
                .build();
    }

    static Correlation mccabeTurbulent() {
        return card("anchor.np.mccabe-turbulent", "McCabe, Smith and Harriott, turbulent", Anchors.ANCHOR)
                .cite(Sources.mccabe())
                .transcription(Transcription.FROM_MEMORY)
                .turbulent()
                .notStated(Sources.GAP_OVER_D, "the table has no column for it")
                .value("KT", 0.35)
                .remark("The table's heading has four baffles of a tenth of the vessel, which cannot be meant for an anchor.")
                .build();
    }

    static Correlation takahashi() {
        return card("anchor.np.takahashi-1980", "Takahashi, Arai and Saito, laminar", Anchors.ANCHOR)
                .cite(Citation.withoutLocator(
                        "K. Takahashi, K. Arai and S. Saito, J. Chem. Eng. Japan 13 (1980) 147-150"))
                .transcription(Transcription.UNSURE)
                .atMost(Measure.REYNOLDS, RegimeLimits.IN_GENERAL.laminarUpTo())
                .notStated(Sources.GAP_OVER_D, "no range is recalled")
                .notStated(Measure.ratio(Dimensions.IMPELLER_HEIGHT, Dimensions.IMPELLER_DIAMETER), "no range is recalled")
                .notStated(Measure.W_OVER_D, "no range is recalled")
                .reads(Variable.REYNOLDS)
                .laminarLimit()
                .constant("a", 8).constant("b", 4).constant("c", 8)
                .constant("d", 0.00539).constant("e", 0.876).constant("f", 1.76)
                .formula("Np = {a} pi^3 (h/D)/(Re ln({b} + {c} c/W)) (1 + {d} (W/D)^{e}/((h/D) (c/D)^{f}))")
                .relation((vessel, k) -> {
                    double height = vessel.ratio(Dimensions.IMPELLER_HEIGHT, Dimensions.IMPELLER_DIAMETER);
                    double width = vessel.ratio(Dimensions.BLADE_WIDTH, Dimensions.IMPELLER_DIAMETER);
                    double gap = vessel.ratio(Dimensions.WALL_GAP, Dimensions.IMPELLER_DIAMETER);
                    double kp = k.get("a") * Math.pow(Math.PI, 3) * height / Math.log(k.get("b") + k.get("c") * gap / width)
                            * (1 + k.get("d") * Math.pow(width, k.get("e")) / (height * Math.pow(gap, k.get("f"))));
                    return point -> kp / point.reynolds();
                })
                .remark("Drag of a plate near a wall; the form is recalled and no second source confirms its digits.")
                .remark("Conflict: 136 at c/D 0.05, about half of 269 by the paddle's equations and of McCabe's 300.")
                .build();
    }

    static Correlation becknerSmith() {
        return card("anchor.np.beckner-smith-1966", "Beckner and Smith", Anchors.ANCHOR)
                .cite(Sources.becknerSmith())
                .transcription(Transcription.UNSURE)
                .notStated(Measure.REYNOLDS, "no range is recalled; the exponent is near that of laminar flow")
                .notStated(Sources.GAP_OVER_T, "no range is recalled")
                .reads(Variable.REYNOLDS)
                .constant("a", 82).constant("b", 0.93).constant("c", 0.25)
                .formula("Np = {a} Re^-{b} (c/T)^-{c}")
                .relation((vessel, k) -> {
                    double atOne = k.get("a") * Math.pow(
                            vessel.ratio(Dimensions.WALL_GAP, Dimensions.VESSEL_DIAMETER), -k.get("c"));
                    double b = k.get("b");
                    return point -> atOne * Math.pow(point.reynolds(), -b);
                })
                .remark("Recalled, and no second source confirms its digits. At Re 1 and c/T 0.05 it gives 173, against 200 to "
                        + "300 in tables.")
                .build();
    }

    static Correlation gate() {
        return card("gate.np.as-an-anchor", "as an anchor, laminar", Anchors.GATE)
                .cite(Citation.commonPractice())
                .transcription(Transcription.UNSURE)
                .scatter(0.2)
                .atMost(Measure.REYNOLDS, RegimeLimits.IN_GENERAL.laminarUpTo())
                .notStated(Sources.GAP_OVER_D, "a rule of the trade without a range")
                .overReynolds("KL", 250)
                .remark("The middle of 200 to 300, the usual range of anchors; the further bars add to it.")
                .build();
    }

    private static CorrelationBuilder card(String id, String title, String family) {
        return Correlation.of(id, Quantity.POWER_NUMBER, title)
                .families(family)
                .noRoomForBaffles()
                .notStated(Measure.BLADE_COUNT, "recalled without it")
                .newtonianData();
    }
}
