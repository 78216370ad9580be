package stirwright.family.discturbine;

import java.util.List;
import org.osgi.service.component.annotations.Component;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.RegimeLimits;

/** The disc turbine and the correlations that were published for it. */
@Component
public final class DiscTurbine implements Contribution {

    static final String ID = "discturbine";

    @Override
    public List<Family> families() {
        return List.of(Family.of(ID, "disc turbine")
                .description("Flat blades, as a rule six, standing upright on the rim of a flat disc; "
                        + "the liquid leaves radially.")
                .parameter(Dimensions.BLADE_COUNT.assumedAs("6", vessel -> 6))
                .parameter(Dimensions.BLADE_WIDTH.assumedAs(
                        "D/5", vessel -> vessel.get(Dimensions.IMPELLER_DIAMETER) / 5))
                .parameter(Dimensions.BLADE_LENGTH.assumedAs(
                        "D/4", vessel -> vessel.get(Dimensions.IMPELLER_DIAMETER) / 4))
                .parameter(Dimensions.BLADE_THICKNESS.assumedAs(
                        "D/50, our choice: no standard value is published",
                        vessel -> vessel.get(Dimensions.IMPELLER_DIAMETER) / 50))
                .regimes(RegimeLimits.IN_GENERAL)
                .build());
    }

    @Override
    public List<Correlation> correlations() {
        return List.of(
                LaminarPower.mccabe(),
                LaminarPower.rushton(),
                TurbulentPower.mccabe(),
                TurbulentPower.rushton(),
                TurbulentPower.rushtonTable(),
                TurbulentPower.bujalski(),
                TurbulentPower.rutherford(),
                PowerCurves.baffled(),
                PowerCurves.unbaffled(),
                PowerCurves.unbaffledTable(),
                PowerCurves.froudeFactor(),
                FlowNumbers.hemrajani(),
                FlowNumbers.mccabe(),
                FlowNumbers.cutter(),
                ShearRateConstants.metznerOtto(),
                ShearRateConstants.metzner(),
                ShearRateConstants.shearThickening());
    }
}
