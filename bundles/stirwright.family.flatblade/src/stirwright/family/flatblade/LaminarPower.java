package stirwright.family.flatblade;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** Power numbers of the laminar regime: a constant over the Reynolds number. */
final class LaminarPower {

    private LaminarPower() {}

    static Correlation twoBlades() {
        return Correlation.of("flatblade.np.mccabe-laminar", Quantity.POWER_NUMBER,
                        "McCabe, Smith and Harriott, two-blade paddle, laminar")
                .families(FlatBlade.ID)
                .cite(Sources.mccabeTable())
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .atMost(Measure.REYNOLDS, 10)
                .baffled(4, 0.1)
                .oneOf(Measure.BLADE_COUNT, 2)
                .nominal(Measure.W_OVER_D, 0.2)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .newtonianData()
                .overReynolds("KL", 36.5)
                .remark("Checked against Kamei and Hiraoka's equations, 35.9 for this paddle at D/T 1/2, and Rushton's table of 1950, "
                        + "7.3 at Re 5.")
                .remark("In laminar flow baffles do not act.")
                .build();
    }

    static Correlation sixBlades() {
        return Correlation.of("flatblade.np.six-blades-laminar", Quantity.POWER_NUMBER, "tables, six open blades, laminar")
                .families(FlatBlade.ID)
                .cite(Citation.withoutLocator("tables of laminar power constants in textbooks; which of them prints it for the "
                        + "open turbine is not at hand"))
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .atMost(Measure.REYNOLDS, 10)
                .inClass(Classifier.BAFFLING, Classifier.BAFFLED, Classifier.UNBAFFLED)
                .remark("In laminar flow baffles do not act.")
                .oneOf(Measure.BLADE_COUNT, 6)
                .nominal(Measure.W_OVER_D, 0.2)
                .notStated(Measure.D_OVER_T, "recalled without a range; checked at 1/3 and 1/2")
                .newtonianData()
                .overReynolds("KL", 70)
                .remark("Checked against Kamei and Hiraoka's equations: 69.1 at D/T 1/3, 75.5 at 1/2. Tables of disc turbines "
                        + "have 65 to 71.")
                .build();
    }
}
