package stirwright.general;

import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** An anchor as a two-blade paddle as high as its arms. */
final class AnchorPower {

    /** Close-clearance impellers leave laminar flow between about Re 30 and 100; the lower figure. */
    private static final double LAMINAR_UP_TO = 30;

    private AnchorPower() {}

    static Correlation paddleForm() {
        return FrictionFrame.declare(Correlation.of("general.np.kamei-hiraoka-anchor", Quantity.POWER_NUMBER,
                        "Kamei and Hiraoka, an anchor as a high paddle, laminar"), Blades.ARMS)
                .families("anchor")
                .cite(Sources.kameiUnbaffled())
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .scatter(0.25)
                .range(Measure.REYNOLDS, Double.NEGATIVE_INFINITY, LAMINAR_UP_TO,
                        "common practice for close clearance: laminar up to 30 to 100")
                .noRoomForBaffles()
                .oneOf(Measure.BLADE_COUNT, 2)
                .notStated(Measure.D_OVER_T, "recalled as 0.3 to 0.8 for paddles, unsure; an anchor has more")
                .notStated(Measure.ratio(Dimensions.IMPELLER_HEIGHT, Dimensions.IMPELLER_DIAMETER), "no range is recalled")
                .notStated(Measure.H_OVER_T, "no range is recalled")
                .newtonianData()
                .contains(Effect.DIAMETER_RATIO, Effect.LIQUID_DEPTH, Effect.BAFFLES, Effect.FROUDE)
                .reads(Variable.REYNOLDS)
                .formula("Np = Np0; " + FrictionFrame.formula(Blades.ARMS))
                .relation((vessel, k) -> {
                    FrictionFrame frame = new FrictionFrame(vessel, Blades.ARMS, k);
                    return point -> frame.powerNumber(point.reynolds());
                })
                .remark("That an anchor in laminar flow takes the power of a paddle of its height is said in a review of "
                        + "these equations: H. Furukawa et al., Int. J. Chem. Eng. 2012, article 106496.")
                .remark("At D/T 0.9 and h = D it gives Np Re 269; McCabe's table has 300 for an anchor, other tables 200 to "
                        + "300, hence the scatter.")
                .remark("The equations go on to turbulent flow; beyond laminar flow nobody here has compared them with an "
                        + "anchor's data.")
                .build();
    }
}
