package stirwright.family.pitchedblade;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** What tables have for the power number of six blades at 45 degrees. */
final class SixBlades {

    private SixBlades() {}

    static Correlation laminar() {
        return card("pitchedblade.np.six-blades-laminar", "tables, six blades, laminar")
                .cite(Citation.withoutLocator("tables of laminar power constants in textbooks; which of them prints it is not at hand"))
                .transcription(Transcription.UNSURE)
                .scatter(0.048)
                .atMost(Measure.REYNOLDS, 10)
                .inClass(Classifier.BAFFLING, Classifier.BAFFLED, Classifier.UNBAFFLED)
                .remark("In laminar flow baffles do not act.")
                .notStated(Measure.W_OVER_D, "recalled without it")
                .overReynolds("KL", 52.5)
                .remark("The middle of 50 to 55, whose ends are the scatter.")
                .remark("Conflict: Rushton et al. have 70 for such a turbine; Kamei and Hiraoka's equations give 65 to 70 for "
                        + "blades of D/5.")
                .build();
    }

    static Correlation rushtonLaminar() {
        return card("pitchedblade.np.rushton-1950-fan-laminar", "Rushton, Costich and Everett, six-blade fan turbine, laminar")
                .cite(Citation.withoutLocator("J. H. Rushton, E. W. Costich and H. J. Everett, Chem. Eng. Prog. 46 (1950) "
                        + "395-404 and 467-476"))
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .atMost(Measure.REYNOLDS, 10)
                .inClass(Classifier.BAFFLING, Classifier.BAFFLED, Classifier.UNBAFFLED)
                .remark("In laminar flow baffles do not act.")
                .notStated(Measure.W_OVER_D, "recalled without it; checked at 1/5")
                .overReynolds("KL", 70)
                .remark("Recalled and unsure by itself; Kamei and Hiraoka's equations, which share nothing with it, give 64.8 at "
                        + "D/T 1/3 and 69.9 at D/T 1/2 for blades of D/5 and so confirm it within 8 %.")
                .remark("Conflict: other tables have 50 to 55.")
                .build();
    }

    static Correlation mccabeTurbulent() {
        return card("pitchedblade.np.mccabe-six-blades", "McCabe, Smith and Harriott, six blades, turbulent")
                .cite(Sources.mccabe("chapter 9, table of K_L and K_T, headed: "
                        + "four baffles a tenth of the vessel wide (from memory)"))
                .transcription(Transcription.FROM_MEMORY)
                .atLeast(Measure.REYNOLDS, 1e4)
                .baffled(4, 0.1)
                .nominal(Measure.W_OVER_D, 0.2)
                .value("KT", 1.63)
                .remark("Tables have 1.62 to 1.64; Medek's formula gives 1.73 at D/T 1/3 and C/D 1.")
                .remark("Conflict: Harriott has 1.7.")
                .build();
    }

    static Correlation narrowTurbulent() {
        return card("pitchedblade.np.six-narrow-blades", "tables, six blades of D/8, turbulent")
                .cite(Citation.withoutLocator("tables of turbulent power numbers in handbooks; which of them prints it is not at hand"))
                .transcription(Transcription.UNSURE)
                .scatter(0.038)
                .atLeast(Measure.REYNOLDS, 1e4)
                .baffled()
                .notStated(Measure.B_OVER_T, "recalled for four baffles of T/12 to T/10")
                .nominal(Measure.W_OVER_D, 0.125)
                .value("Npt", 1.35)
                .remark("The middle of 1.3 to 1.4, whose ends are the scatter.")
                .remark("Conflict: from 1.63 for blades of D/5 the width to 1.0 or 1.25 leads to 1.02 or 0.91, and Hiraoka et al. "
                        + "(1997) have 1.12 for D/8.")
                .build();
    }

    private static CorrelationBuilder card(String id, String title) {
        return Correlation.of(id, Quantity.POWER_NUMBER, title)
                .families(PitchedBlade.ID)
                .oneOf(Measure.BLADE_COUNT, 6)
                .nominal(Measure.BLADE_ANGLE, 45)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .newtonianData();
    }
}
