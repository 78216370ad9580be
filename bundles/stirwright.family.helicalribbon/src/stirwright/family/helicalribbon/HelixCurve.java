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

    private static final double LAMINAR = 318;

    /** The usable forms for ribbons lie so far around their middle. */
    private static final double FORMS = 0.12;

    private static final Correlation RIEGER = LaminarPower.rieger();

    private static final Measure BY_RIEGER = Measure.of("laminar_constant_by_rieger", "Np Re by Rieger et al.",
            (vessel, point) -> LaminarPower.rieger(vessel, RIEGER.constants()));

    private HelixCurve() {}

    static Correlation dickey() {
        return Correlation.of("helicalribbon.np.dickey-helix", Quantity.POWER_NUMBER, "Dickey, helix, into the transition")
                .families(HelicalRibbon.ID)
                .cite(Sources.dickey())
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .range(Measure.REYNOLDS, Double.NEGATIVE_INFINITY, 1994, "the last printed factor")
                .noRoomForBaffles()
                .notStated(Sources.GAP_OVER_D, NOT_DESCRIBED)
                .notStated(Sources.HEIGHT_OVER_D, NOT_DESCRIBED)
                .notStated(Sources.PITCH_RATIO, NOT_DESCRIBED)
                .notStated(Sources.RIBBON_OVER_D, NOT_DESCRIBED)
                .notStated(Sources.RIBBON_COUNT, NOT_DESCRIBED)
                .notStated(Measure.H_OVER_T, NOT_DESCRIBED)
                .range(BY_RIEGER, LAMINAR * (1 - FORMS), LAMINAR / (1 - FORMS),
                        "ribbons that take about his helix's laminar power; ours, since he describes none")
                .newtonianData()
                .reads(Variable.REYNOLDS)
                .laminarLimit()
                .constant("Kp", LAMINAR)
                .curve("f", 1, 1, Sources.LAMINAR_UP_TO, 1, 662, 1.8, 1191, 2.3, 1994, 3)
                .formula("Np = {Kp} f/Re, f over Re {f}")
                .relation((vessel, k) -> {
                    double kp = k.get("Kp");
                    ChartCurve f = k.curve("f");
                    return point -> kp * f.at(point.reynolds()) / point.reynolds();
                })
                .remark("Printed are 318, constant below Re 60, and the factors 1.8, 2.3 and 3.0; the straight lines between them "
                        + "are ours, and the longest of them, from 60 to 662, is uncertain.")
                .remark("It knows no proportions, and power goes with them: so it is held to ribbons whose laminar constant by Rieger "
                        + "et al. is within 12 % of his, as far as the forms for ribbons agree. Any other ribbon may take several "
                        + "times this power.")
                .build();
    }
}
