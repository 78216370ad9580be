package stirwright.family.helicalscrew;

import static stirwright.correlation.Dimensions.CLEARANCE;
import static stirwright.correlation.Dimensions.DRAFT_TUBE_DIAMETER;
import static stirwright.correlation.Dimensions.IMPELLER_DIAMETER;
import static stirwright.correlation.Dimensions.IMPELLER_HEIGHT;
import static stirwright.correlation.Dimensions.PITCH_RATIO;
import static stirwright.correlation.Dimensions.SHAFT_DIAMETER;
import static stirwright.correlation.Dimensions.VESSEL_DIAMETER;

import java.util.List;
import org.osgi.service.component.annotations.Component;
import stirwright.correlation.Classifier;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;
import stirwright.correlation.Geometry;
import stirwright.correlation.RegimeLimits;

/** The helical screw, free or in a draft tube, and what is known of it. */
@Component
public final class HelicalScrew implements Contribution {

    static final String ID = "helicalscrew";
    static final String IN_A_TUBE = "in a draft tube";
    static final String FREE = "free";

    static final Classifier SURROUNDINGS = Classifier.of("screw_surroundings", "screw",
            (vessel, point) -> inATube(vessel) ? IN_A_TUBE : FREE);

    @Override
    public List<Family> families() {
        return List.of(Family.of(ID, "helical screw")
                .description("A flight wound around the shaft from near the bottom upwards, free in the vessel or in a draft tube "
                        + "through which it pumps. Its constants are unsure, so nothing is recommended.")
                .parameter(CLEARANCE.withMeaning("lower edge of the flight above the bottom")
                        .assumedAs("D/2, our choice", vessel -> vessel.get(IMPELLER_DIAMETER) / 2))
                .parameter(IMPELLER_HEIGHT.withMeaning("lower to upper edge of the flight")
                        .assumedAs("1.5 D, our choice", vessel -> 1.5 * vessel.get(IMPELLER_DIAMETER)))
                .parameter(PITCH_RATIO.withMeaning("height that the flight climbs in one turn, over the diameter")
                        .assumedAs("1", vessel -> 1))
                .parameter(SHAFT_DIAMETER.withMeaning("diameter of the shaft inside the flight")
                        .assumedAs("D/4, our choice", vessel -> vessel.get(IMPELLER_DIAMETER) / 4))
                .parameter(DRAFT_TUBE_DIAMETER.withMeaning("inner diameter of the tube around the screw; 0: free, no tube")
                        .withLimits(0, Double.MAX_VALUE)
                        .assumedAs("1.1 D, our choice", vessel -> 1.1 * vessel.get(IMPELLER_DIAMETER)))
                .below(SHAFT_DIAMETER, IMPELLER_DIAMETER, 1)
                .below(DRAFT_TUBE_DIAMETER, VESSEL_DIAMETER, 1)
                .rule(DRAFT_TUBE_DIAMETER, "0 for a free screw or above impeller_diameter_m",
                        vessel -> !inATube(vessel) || vessel.get(DRAFT_TUBE_DIAMETER) > vessel.get(IMPELLER_DIAMETER))
                .regimes(RegimeLimits.IN_GENERAL)
                .build());
    }

    private static boolean inATube(Geometry vessel) {
        return vessel.get(DRAFT_TUBE_DIAMETER) > 0;
    }

    @Override
    public List<Correlation> correlations() {
        return List.of(TubeConstants.power(), TubeConstants.shearRate(), PowerLimits.least(), PowerLimits.most());
    }
}
