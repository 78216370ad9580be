package stirwright.family.propeller;

import java.util.List;
import org.osgi.service.component.annotations.Component;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.Measure;
import stirwright.correlation.RegimeLimits;

/** The marine propeller, told apart by its pitch, and the correlations that were published for it. */
@Component
public final class Propeller implements Contribution {

    static final String ID = "propeller";

    static final Measure PITCH = Measure.of(Dimensions.PITCH_RATIO);

    @Override
    public List<Family> families() {
        return List.of(Family.of(ID, "marine propeller")
                .description("Broad blades twisted like a ship's screw, as a rule three; the flow is axial. The pitch is "
                        + "how far the screw would advance in one turn without slip: as far as its diameter at p/D 1, "
                        + "called square pitch.")
                .parameter(Dimensions.BLADE_COUNT.assumedAs("3", vessel -> 3))
                .parameter(Dimensions.PITCH_RATIO
                        .withMeaning("how far the screw would advance in one turn without slip, over its diameter")
                        .withLimits(0.3, 3)
                        .assumedAs("1, square pitch", vessel -> 1))
                .regimes(RegimeLimits.IN_GENERAL)
                .build());
    }

    @Override
    public List<Correlation> correlations() {
        return List.of(
                LaminarPower.square(),
                LaminarPower.oneAndAHalf(),
                LaminarPower.two(),
                TurbulentPower.square(),
                TurbulentPower.doran(),
                TurbulentPower.earle(),
                TurbulentPower.oneAndAHalf(),
                TurbulentPower.two(),
                RushtonTable.baffled(),
                RushtonTable.unbaffled(),
                FlowNumbers.square(),
                FlowNumbers.oneAndAHalf(),
                ShearRateConstants.square(),
                ShearRateConstants.two(),
                ShearRateConstants.fourBlades());
    }
}
