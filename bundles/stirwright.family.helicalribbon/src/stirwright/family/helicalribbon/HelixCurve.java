package stirwright.family.helicalribbon;

import stirwright.correlation.ChartCurve;
import stirwright.correlation.Correlation;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** The one printed curve that goes beyond laminar flow. */
final class HelixCurve {

    private static final String NOT_DESCRIBED = "the section says helix and no more";

    private HelixCurve() {}

    static Correlation dickey() {
        return Correlation.of("helicalribbon.np.dickey-helix", Quantity.POWER_NUMBER, "Dickey, helix, into the transition")
                .families(HelicalRibbon.ID)
                .cite(Sources.dickey())
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .range(Measure.REYNOLDS, Double.NEGATIVE_INFINITY, 1994, "the last printed factor")
                .unbaffled()
                .notStated(Sources.GAP_OVER_D, NOT_DESCRIBED)
                .notStated(Sources.HEIGHT_OVER_D, NOT_DESCRIBED)
                .notStated(Sources.PITCH_RATIO, NOT_DESCRIBED)
                .notStated(Sources.RIBBON_OVER_D, NOT_DESCRIBED)
                .notStated(Sources.RIBBON_COUNT, NOT_DESCRIBED)
                .notStated(Measure.H_OVER_T, NOT_DESCRIBED)
                .newtonianData()
                .reads(Variable.REYNOLDS)
                .laminarLimit()
                .constant("Kp", 318)
                .curve("f", 1, 1, Sources.LAMINAR_UP_TO, 1, 662, 1.8, 1191, 2.3, 1994, 3)
                .formula("Np = {Kp} f/Re, f over Re {f}")
                .relation((vessel, k) -> {
                    double kp = k.get("Kp");
                    ChartCurve f = k.curve("f");
                    return point -> kp * f.at(point.reynolds()) / point.reynolds();
                })
                .remark("Printed are 318, constant below Re 60, and the factors 1.8, 2.3 and 3.0; the straight lines between them "
                        + "are ours, and the longest of them, from 60 to 662, is uncertain.")
                .remark("No baffles: a helix at the wall leaves no room for them.")
                .remark("It knows no proportions: for a ribbon of other proportions than his it is a size, not a value.")
                .build();
    }
}
