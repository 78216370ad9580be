package stirwright.family.pitchedblade;

import java.util.List;
import org.osgi.service.component.annotations.Component;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.RegimeLimits;

/** The pitched-blade turbine and the correlations that were published for it. */
@Component
public final class PitchedBlade implements Contribution {

    static final String ID = "pitchedblade";

    @Override
    public List<Family> families() {
        return List.of(Family.of(ID, "pitched-blade turbine")
                .description("Flat blades set at an angle on a hub, as a rule four at 45 degrees; the flow is mixed, "
                        + "mostly axial. Its regime limits are those of a design text for this impeller.")
                .parameter(Dimensions.BLADE_COUNT.assumedAs("4", vessel -> 4))
                .parameter(Dimensions.BLADE_ANGLE.assumedAs("45 degrees", vessel -> Math.toRadians(45)))
                .parameter(Dimensions.BLADE_WIDTH.assumedAs(
                        "D/5", vessel -> vessel.get(Dimensions.IMPELLER_DIAMETER) / 5))
                .regimes(RegimeLimits.of(50, Sources.TURBULENT_FROM, Sources.ludwig("p. 300")))
                .build());
    }

    @Override
    public List<Correlation> correlations() {
        return List.of(
                PowerNumbers.mccabeLaminar(),
                PowerNumbers.mccabeTurbulent(),
                PowerNumbers.dickeyHicks(),
                PowerNumbers.medek(),
                PowerNumbers.harriott(),
                SixBlades.laminar(),
                SixBlades.rushtonLaminar(),
                SixBlades.mccabeTurbulent(),
                SixBlades.narrowTurbulent(),
                FlowNumbers.hemrajani(),
                FlowNumbers.mccabe(),
                FlowNumbers.sixBlades(),
                FlowNumbers.overDiameterRatio(),
                FlowNumbers.overReynolds(),
                FlowNumbers.circulation(),
                ShearRateConstants.fourBlades(),
                ShearRateConstants.metzner());
    }
}
