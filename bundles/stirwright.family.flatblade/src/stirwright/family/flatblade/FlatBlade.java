package stirwright.family.flatblade;

import java.util.List;
import org.osgi.service.component.annotations.Component;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.RegimeLimits;

/** The open flat-blade turbine and the flat paddle, and what tables have for them. */
@Component
public final class FlatBlade implements Contribution {

    static final String ID = "flatblade";

    @Override
    public List<Family> families() {
        return List.of(Family.of(ID, "flat-blade turbine or paddle")
                .description("Two to eight flat blades standing upright on a hub, without a disc; the liquid leaves radially. "
                        + "With two blades it is called a paddle.")
                .parameter(Dimensions.BLADE_COUNT
                        .withMeaning("blades of one impeller; a bar through the shaft counts as two")
                        .assumedAs("6", vessel -> 6))
                .parameter(Dimensions.BLADE_WIDTH
                        .withMeaning("height of the upright blade, lower to upper edge")
                        .assumedAs("D/5", vessel -> vessel.get(Dimensions.IMPELLER_DIAMETER) / 5))
                .regimes(RegimeLimits.IN_GENERAL)
                .build());
    }

    @Override
    public List<Correlation> correlations() {
        return List.of(
                LaminarPower.twoBlades(),
                LaminarPower.sixBlades(),
                RushtonTable.paddle(),
                TurbulentPower.twoBlades(),
                TurbulentPower.fourBlades(),
                TurbulentPower.sixBlades(),
                FlowAndShear.flow(),
                FlowAndShear.twoBlades());
    }
}
