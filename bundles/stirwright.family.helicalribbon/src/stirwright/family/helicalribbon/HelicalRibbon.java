package stirwright.family.helicalribbon;

import java.util.List;
import org.osgi.service.component.annotations.Component;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.RegimeLimits;

/** The helical ribbon and the correlations that were published for it. */
@Component
public final class HelicalRibbon implements Contribution {

    static final String ID = "helicalribbon";

    /** Common practice, no source: with a wider gap it is no close-clearance impeller. */
    private static final double WIDEST_GAP = 0.25;

    @Override
    public List<Family> families() {
        return List.of(Family.of(ID, "helical ribbon")
                .description("One or two flat bands wound as a screw along the wall and carried by arms from the shaft; the liquid "
                        + "rises or sinks at the wall and returns in the middle.")
                .parameter(Dimensions.VESSEL_DIAMETER.assumedAs(
                        "D/0.95", vessel -> vessel.get(Dimensions.IMPELLER_DIAMETER) / 0.95))
                .parameter(Dimensions.CLEARANCE.withMeaning("lower edge of the ribbon above the bottom")
                        .assumedAs("(T - D)/2, as far as from the wall", vessel -> (vessel.get(Dimensions.VESSEL_DIAMETER)
                                - vessel.get(Dimensions.IMPELLER_DIAMETER)) / 2))
                .parameter(Dimensions.BAFFLE_COUNT.usually("0", vessel -> 0))
                .parameter(Dimensions.IMPELLER_HEIGHT.withMeaning("lower to upper edge of the ribbon")
                        .assumedAs("D", vessel -> vessel.get(Dimensions.IMPELLER_DIAMETER)))
                .parameter(Dimensions.PITCH_RATIO.withMeaning("height that one ribbon climbs in one turn, over the diameter")
                        .assumedAs("1", vessel -> 1))
                .parameter(Dimensions.RIBBON_WIDTH.assumedAs(
                        "D/10", vessel -> vessel.get(Dimensions.IMPELLER_DIAMETER) / 10))
                .parameter(Dimensions.RIBBON_COUNT.assumedAs("2", vessel -> 2))
                .below(Dimensions.WALL_GAP, Dimensions.IMPELLER_DIAMETER, WIDEST_GAP)
                .below(Dimensions.RIBBON_WIDTH, Dimensions.IMPELLER_DIAMETER, 0.5)
                .regimes(RegimeLimits.of(Sources.LAMINAR_UP_TO, Sources.TURBULENT_FROM, Sources.dickey()))
                .build());
    }

    @Override
    public List<Correlation> correlations() {
        return List.of(
                LaminarPower.rieger(),
                LaminarPower.shamlouEdwards(),
                LaminarPower.kaeppel(),
                LaminarPower.blasinskiRzyski(),
                LaminarPower.hallGodfrey(),
                LaminarPower.nagata(),
                HelixCurve.dickey(),
                ShearRateConstants.nagata(),
                ShearRateConstants.shamlouEdwards());
    }
}
