package stirwright.family.anchor;

import java.util.List;
import org.osgi.service.component.annotations.Component;
import stirwright.correlation.Citation;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.RegimeLimits;

/** The anchor and the gate; the anchor's power as a high paddle stands with the paddle's equations. */
@Component
public final class Anchors implements Contribution {

    static final String ANCHOR = "anchor";
    static final String GATE = "gate";

    /** Between about 30 and 100 for impellers near the wall: the lower figure, common practice. */
    static final double LAMINAR_UP_TO = 30;

    /** Common practice, no source: with a wider gap it is no close-clearance impeller. */
    private static final double WIDEST_GAP = 0.25;

    @Override
    public List<Family> families() {
        return List.of(
                closeToTheWall(ANCHOR, "anchor",
                        "Upright arms, as a rule two, that follow the wall at a small distance and are joined along the bottom; "
                                + "the flow goes round, there is little exchange between top and bottom."),
                closeToTheWall(GATE, "gate",
                        "An anchor whose frame is closed and crossed by further bars. Nothing of its own is known here for "
                                + "sure, so nothing is recommended."));
    }

    private static Family closeToTheWall(String id, String title, String description) {
        return Family.of(id, title)
                .description(description + " Laminar flow ends between Re 30 and 100: common practice; the turbulent limit is "
                        + "that of impellers in general.")
                .parameter(Dimensions.VESSEL_DIAMETER.assumedAs(
                        "D/0.9", vessel -> vessel.get(Dimensions.IMPELLER_DIAMETER) / 0.9))
                .parameter(Dimensions.CLEARANCE.withMeaning("lower edge of the impeller above the bottom")
                        .assumedAs("(T - D)/2, as far as from the wall", vessel -> (vessel.get(Dimensions.VESSEL_DIAMETER)
                                - vessel.get(Dimensions.IMPELLER_DIAMETER)) / 2))
                .parameter(Dimensions.BAFFLE_COUNT.usually("0", vessel -> 0))
                .parameter(Dimensions.IMPELLER_HEIGHT.withMeaning("lower to upper edge of the arms")
                        .assumedAs("D", vessel -> vessel.get(Dimensions.IMPELLER_DIAMETER)))
                .parameter(Dimensions.BLADE_COUNT.withMeaning("upright arms at the wall").usually("2", vessel -> 2))
                .parameter(Dimensions.BLADE_WIDTH.withMeaning("radial width of one arm")
                        .assumedAs("D/10", vessel -> vessel.get(Dimensions.IMPELLER_DIAMETER) / 10))
                .below(Dimensions.WALL_GAP, Dimensions.IMPELLER_DIAMETER, WIDEST_GAP)
                .regimes(RegimeLimits.of(LAMINAR_UP_TO, RegimeLimits.IN_GENERAL.turbulentFrom(), Citation.commonPractice()))
                .build();
    }

    @Override
    public List<Correlation> correlations() {
        return List.of(
                PowerNumbers.mccabeLaminar(),
                PowerNumbers.mccabeTurbulent(),
                PowerNumbers.takahashi(),
                PowerNumbers.becknerSmith(),
                PowerNumbers.gate(),
                ShearRateConstants.becknerSmith(),
                ShearRateConstants.metzner(),
                ShearRateConstants.designPractice(),
                ShearRateConstants.gate());
    }
}
