package example;

import java.util.List;
import org.osgi.service.component.annotations.Component;
import stirwright.correlation.Citation;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.FluidClass;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Standing;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** One impeller family with one correlation. Impeller and numbers are invented: replace them by yours. */
@Component
public final class ExampleFamily implements Contribution {
    private static final Citation SOURCE = Citation.of("Invented for this template", "constants A and B");

    @Override
    public List<Family> families() {
        return List.of(Family.of("ringblade", "ring-blade impeller")
                .description("Invented: six straight blades that carry a ring at their tips.")
                .parameter(Dimensions.BLADE_COUNT.assumedAs("6", g -> 6))
                .parameter(Dimensions.BLADE_WIDTH.assumedAs("D/6", g -> g.get(Dimensions.IMPELLER_DIAMETER) / 6))
                .regimes(RegimeLimits.of(10, 1e4, SOURCE))
                .build());
    }

    @Override
    public List<Correlation> correlations() {
        return List.of(Correlation.of("ringblade.np.example", Quantity.POWER_NUMBER, "laminar to turbulent")
                .families("ringblade")
                .cite(SOURCE)
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .standing(Standing.IN_HOUSE_DRAFT)
                .range(Measure.REYNOLDS, 0.1, 1e5)
                .baffled()
                .range(Measure.D_OVER_T, 0.3, 0.5)
                .oneOf(Measure.BLADE_COUNT, 6)
                .fluids(FluidClass.NEWTONIAN, FluidClass.SHEAR_THINNING)
                .notStated(Measure.VESSEL_DIAMETER, "invented without a scale")
                .laminarLimit()
                .reads(Variable.REYNOLDS)
                .constant("A", 64)
                .constant("B", 3.2)
                .formula("Np = {A}/Re + {B}")
                .relation((vessel, k) -> {
                    double a = k.get("A");
                    double b = k.get("B");
                    return point -> a / point.reynolds() + b;
                })
                .remark("Invented; not for use.")
                .build());
    }
}
