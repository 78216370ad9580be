package stirwright.family.discturbine;

import java.util.List;
import java.util.stream.Stream;
import org.osgi.service.component.annotations.Component;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.RegimeLimits;

/** The disc turbine, with flat and with concave blades, and the correlations that were published for it. */
@Component
public final class DiscTurbine implements Contribution {

    static final String ID = "discturbine";

    @Override
    public List<Family> families() {
        return List.of(flat(), ConcaveDisc.family());
    }

    private static Family flat() {
        return Family.of(ID, "disc turbine")
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
                .regimes(RegimeLimits.IN_GENERAL.withShearThinning(40, 1e4, Sources.metznerOtto(),
                        "The literature gives 40 to 100 for the end of the laminar regime (recalled, from Nienow too), of "
                                + "which the lower end is taken; the end of the transition is the general one."))
                .build();
    }

    @Override
    public List<Correlation> correlations() {
        return Stream.concat(flatBlades().stream(), ConcaveDisc.correlations().stream()).toList();
    }

    private static List<Correlation> flatBlades() {
        return List.of(
                LaminarPower.mccabe(),
                LaminarPower.rushton(),
                TurbulentPower.mccabe(),
                TurbulentPower.rushton(),
                TurbulentPower.rushtonFourBlades(),
                TurbulentPower.rushtonSixBlades(),
                TurbulentPower.rushtonTwelveBlades(),
                TurbulentPower.bujalski(),
                TurbulentPower.rutherford(),
                Handbooks.geankoplis(),
                Handbooks.harriott(),
                Handbooks.laityTreybal(),
                Trends.bladeCount(),
                Trends.furukawa(),
                Trends.baffleWidth(),
                PowerCurves.baffled(),
                PowerCurves.unbaffled(),
                PowerCurves.unbaffledTable(),
                PowerCurves.froudeFactor(),
                FlowNumbers.hemrajani(),
                FlowNumbers.transition(),
                FlowNumbers.mccabe(),
                FlowNumbers.cutter(),
                ShearRateConstants.metznerOtto(),
                ShearRateConstants.metzner(),
                ShearRateConstants.metznerTwo(),
                ShearRateConstants.shearThickening());
    }
}
