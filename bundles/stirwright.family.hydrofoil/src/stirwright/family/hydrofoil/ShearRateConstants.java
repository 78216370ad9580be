package stirwright.family.hydrofoil;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;

/** Average shear rate over speed, per revolution. */
final class ShearRateConstants {

    private ShearRateConstants() {}

    static Correlation narrow() {
        return Correlation.of("hydrofoil.ks.compilations-narrow", Quantity.SHEAR_RATE_CONSTANT,
                        "later compilations, three narrow blades")
                .families(Hydrofoil.ID)
                .cite(Citation.withoutLocator("compilations of Metzner-Otto constants; which of them is not recalled"))
                .transcription(Transcription.FROM_MEMORY)
                .atMost(Measure.REYNOLDS, RegimeLimits.IN_GENERAL.turbulentFrom())
                .notStated(Classifier.BAFFLING, "recalled without it")
                .oneOf(Measure.BLADE_COUNT, Hydrofoil.NARROW)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .notStated(Classifier.FLUID, "recalled for non-Newtonian fluids, not of which kind")
                .value("ks", 10)
                .remark("The constant is defined by Metzner and Otto's procedure, whose abstract says laminar and "
                        + "transition regions; the end of the transition is the family's limit, not theirs.")
                .remark("For four wide blades no constant is at hand.")
                .build();
    }
}
