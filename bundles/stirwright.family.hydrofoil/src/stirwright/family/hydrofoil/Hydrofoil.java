package stirwright.family.hydrofoil;

import java.util.List;
import org.osgi.service.component.annotations.Component;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.RegimeLimits;

/** The hydrofoil, narrow with three blades or wide with four, and what is known of it in general. */
@Component
public final class Hydrofoil implements Contribution {

    static final String ID = "hydrofoil";

    /** Blade count of narrow blades. */
    static final int NARROW = 3;

    /** Blade count of wide blades. */
    static final int WIDE = 4;

    @Override
    public List<Family> families() {
        return List.of(Family.of(ID, "hydrofoil")
                .description("Cambered blades that grow flatter and narrower towards the tip, so that the flow is axial "
                        + "with little swirl: three narrow ones, or four wide ones that cover most of the circle (high "
                        + "solidity). The blade count tells the two apart; other shapes have no numbers here. Makers' own "
                        + "shapes differ, so a maker's number goes before these.")
                .parameter(Dimensions.BLADE_COUNT
                        .withMeaning("blades of one impeller; 3: narrow blades, 4: wide blades of high solidity")
                        .assumedAs("3, narrow blades", vessel -> NARROW))
                .regimes(RegimeLimits.IN_GENERAL)
                .build());
    }

    @Override
    public List<Correlation> correlations() {
        return List.of(
                PowerNumbers.laminarNarrow(),
                PowerNumbers.narrow(),
                PowerNumbers.wide(),
                FlowNumbers.narrow(),
                FlowNumbers.mccabe(),
                FlowNumbers.wide(),
                ShearRateConstants.narrow());
    }
}
