package stirwright.family.pitchedblade;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** Average shear rate over speed, per revolution. */
final class ShearRateConstants {

    private static final String TRANSITION_ENDS =
            "The constant is defined by Metzner and Otto's procedure, whose abstract says laminar and transition "
            + "regions; the end of the transition is the family's limit, not theirs.";

    private ShearRateConstants() {}

    static Correlation fourBlades() {
        return Correlation.of("pitchedblade.ks.four-blades", Quantity.SHEAR_RATE_CONSTANT,
                        "four blades, later compilations")
                .families(PitchedBlade.ID)
                .cite(Citation.withoutLocator("compilations of Metzner-Otto constants, among them D. Doraiswamy, "
                        + "R. K. Grenville and A. W. Etchells, Ind. Eng. Chem. Res. 33 (1994) 2253-2258"))
                .transcription(Transcription.FROM_MEMORY)
                .atMost(Measure.REYNOLDS, Sources.TURBULENT_FROM)
                .notStated(Classifier.BAFFLING, "recalled without it")
                .oneOf(Measure.BLADE_COUNT, 4)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .notStated(Classifier.FLUID, "recalled for non-Newtonian fluids, not of which kind")
                .value("ks", 11)
                .remark(TRANSITION_ENDS)
                .remark("Values from 10 to 13 are listed; which compilation prints 11 is not checked.")
                .build();
    }

    static Correlation metzner() {
        return Correlation.of("pitchedblade.ks.metzner-1961", Quantity.SHEAR_RATE_CONSTANT,
                        "Metzner et al., six-blade fan turbine at 45 degrees")
                .families(PitchedBlade.ID)
                .cite(Citation.withoutLocator("A. B. Metzner, R. H. Feehs, H. L. Ramos, R. E. Otto and J. D. Tuthill, "
                        + "AIChE J. 7 (1961) 3-9"))
                .transcription(Transcription.FROM_MEMORY)
                .scatter(0.154)
                .atMost(Measure.REYNOLDS, Sources.TURBULENT_FROM)
                .notStated(Classifier.BAFFLING, "recalled without it")
                .oneOf(Measure.BLADE_COUNT, 6)
                .nominal(Measure.BLADE_ANGLE, 45)
                .range(Measure.D_OVER_T, 0.333, 0.769)
                .notStated(Classifier.FLUID, "recalled for non-Newtonian fluids, not of which kind")
                .value("ks", 13)
                .remark(TRANSITION_ENDS)
                .remark("13 plus or minus 2, T/D 1.3 to 3.")
                .remark("Conflict: the flow between two cylinders of the same torque (Kp 70, blades of D/5) has 11.9 at D/T 1/3 "
                        + "and 18.8 at D/T 1/2 for n 0.5.")
                .build();
    }
}
