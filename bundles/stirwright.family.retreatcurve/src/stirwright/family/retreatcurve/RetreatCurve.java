package stirwright.family.retreatcurve;

import java.util.List;
import org.osgi.service.component.annotations.Component;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.RegimeLimits;

/** The retreat-curve impeller of glass-lined vessels and what is known of it, most of it unsure. */
@Component
public final class RetreatCurve implements Contribution {

    static final String ID = "retreatcurve";

    @Override
    public List<Family> families() {
        return List.of(Family.of(ID, "retreat-curve impeller")
                .description("Three rounded blades that curve back against the rotation, made for glass-lined vessels and "
                        + "set close to the dished bottom; the flow is mostly radial. Most of its numbers here are unsure, "
                        + "so outside of turbulent flow with one baffle nothing is recommended.")
                .parameter(Dimensions.BAFFLE_COUNT.withMeaning(
                        "baffles, whether on the wall or hung from the cover as glass-lined vessels have them; 0: unbaffled"))
                .parameter(Dimensions.BLADE_COUNT.assumedAs("3", vessel -> 3))
                .regimes(RegimeLimits.IN_GENERAL)
                .build());
    }

    @Override
    public List<Correlation> correlations() {
        return List.of(
                PowerNumbers.laminar(),
                PowerNumbers.unbaffled(),
                PowerNumbers.oneBaffle(),
                PowerNumbers.fourBaffles(),
                Unsure.flowNumber(),
                Unsure.shearRateConstant());
    }
}
