package stirwright.family.propeller;

import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;

/** Average shear rate over speed, per revolution. */
final class ShearRateConstants {

    private static final String TRANSITION_ENDS =
            "The constant is defined by Metzner and Otto's procedure, whose abstract says laminar and transition "
            + "regions; the end of the transition is the family's limit, not theirs.";
    private static final String NON_NEWTONIAN = "recalled for non-Newtonian fluids, not of which kind";

    private ShearRateConstants() {}

    static Correlation square() {
        return Correlation.of("propeller.ks.metzner-1961-pitch-1", Quantity.SHEAR_RATE_CONSTANT,
                        "Metzner et al., square pitch")
                .families(Propeller.ID)
                .cite(Sources.metznerTables())
                .transcription(Transcription.FROM_MEMORY)
                .scatter(0.09)
                .atMost(Measure.REYNOLDS, RegimeLimits.IN_GENERAL.turbulentFrom())
                .notStated(Classifier.BAFFLING, "recalled without it")
                .oneOf(Measure.BLADE_COUNT, 3)
                .nominal(Propeller.PITCH, 1)
                .range(Measure.D_OVER_T, 0.208, 0.455)
                .notStated(Classifier.FLUID, NON_NEWTONIAN)
                .value("ks", 10)
                .remark(TRANSITION_ENDS)
                .remark("10 plus or minus 0.9, T/D 2.2 to 4.8.")
                .remark("The analogy with the gap between cylinders gives 10.1 at flow index 0.5 from a laminar constant "
                        + "of 41, with blades 0.12 D high.")
                .build();
    }

    static Correlation two() {
        return Correlation.of("propeller.ks.skelland-pitch-2", Quantity.SHEAR_RATE_CONSTANT, "Skelland's table, double pitch")
                .families(Propeller.ID)
                .cite(Sources.metznerTables())
                .transcription(Transcription.FROM_MEMORY)
                .atMost(Measure.REYNOLDS, RegimeLimits.IN_GENERAL.turbulentFrom())
                .notStated(Classifier.BAFFLING, "recalled without it")
                .notStated(Measure.BLADE_COUNT, "recalled without it")
                .nominal(Propeller.PITCH, 2)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .notStated(Classifier.FLUID, NON_NEWTONIAN)
                .value("ks", 10)
                .remark(TRANSITION_ENDS)
                .build();
    }

    static Correlation fourBlades() {
        return Correlation.of("propeller.ks.skelland-four-blades", Quantity.SHEAR_RATE_CONSTANT, "Skelland's table, four blades")
                .families(Propeller.ID)
                .cite(Sources.metznerTables())
                .transcription(Transcription.FROM_MEMORY)
                .atMost(Measure.REYNOLDS, RegimeLimits.IN_GENERAL.turbulentFrom())
                .notStated(Classifier.BAFFLING, "recalled without it")
                .oneOf(Measure.BLADE_COUNT, 4)
                .notStated(Propeller.PITCH, "recalled without it")
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .notStated(Classifier.FLUID, NON_NEWTONIAN)
                .value("ks", 10)
                .remark(TRANSITION_ENDS)
                .build();
    }
}
