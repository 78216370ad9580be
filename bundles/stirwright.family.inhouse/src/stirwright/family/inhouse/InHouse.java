package stirwright.family.inhouse;

import java.util.List;
import org.osgi.service.component.annotations.Component;
import stirwright.correlation.Citation;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Standing;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/**
 * An impeller and a correlation, both invented, to be replaced by your own. As long as there is no
 * shear-rate constant among them, a case gives one in its column.
 */
@Component
public final class InHouse implements Contribution {

    private static final String ID = "inhouse";

    @Override
    public List<Family> families() {
        return List.of(Family.of(ID, "in-house impeller")
                .description("Invented, to be replaced: upright blades on a hub. Describe your impeller here so that "
                        + "somebody who never saw it can draw it, and give the family its dimensions.")
                .parameter(Dimensions.BLADE_COUNT.assumedAs("4, invented", vessel -> 4))
                .parameter(Dimensions.BLADE_WIDTH.assumedAs(
                        "D/6, invented", vessel -> vessel.get(Dimensions.IMPELLER_DIAMETER) / 6))
                .regimes(RegimeLimits.IN_GENERAL)
                .build());
    }

    @Override
    public List<Correlation> correlations() {
        return List.of(
                invented());
    }

    /** Every correlation starts as a draft: shown, never recommended. One that was released says APPROVED. */
    private static CorrelationBuilder draft(String id, Quantity quantity, String title) {
        return Correlation.of(id, quantity, title)
                .families(ID)
                .standing(Standing.IN_HOUSE_DRAFT)
                .transcription(Transcription.CHECKED_AGAINST_SOURCE);
    }

    private static Correlation invented() {
        return draft("inhouse.np.invented", Quantity.POWER_NUMBER, "invented, laminar to turbulent")
                .cite(Citation.of("Invented for this template", "constants A and B"))
                .range(Measure.REYNOLDS, 0.1, 1e5)
                .baffled()
                .oneOf(Measure.BLADE_COUNT, 4)
                .range(Measure.W_OVER_D, 0.1, 0.25)
                .range(Measure.D_OVER_T, 0.3, 0.5)
                .newtonianData()
                .laminarLimit()
                .reads(Variable.REYNOLDS)
                .constant("A", 55)
                .constant("B", 6.5)
                .formula("Np = {A}/Re + {B} W/D")
                .relation((vessel, k) -> {
                    double laminar = k.get("A");
                    double turbulent = k.get("B") * vessel.ratio(Dimensions.BLADE_WIDTH, Dimensions.IMPELLER_DIAMETER);
                    return point -> laminar / point.reynolds() + turbulent;
                })
                .remark("Invented; not for use.")
                .build();
    }
}
