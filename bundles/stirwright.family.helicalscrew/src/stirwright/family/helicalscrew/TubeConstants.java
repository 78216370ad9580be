package stirwright.family.helicalscrew;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;

/** The two constants that are passed on for a screw in a draft tube, in laminar flow. */
final class TubeConstants {

    private TubeConstants() {}

    static Correlation power() {
        return inATube("helicalscrew.np.in-a-draft-tube", Quantity.POWER_NUMBER, "in a draft tube, laminar")
                .cite(Citation.commonPractice())
                .scatter(0.17)
                .newtonianData()
                .overReynolds("KL", 300)
                .remark("The middle of 250 to 350, passed on without a screw's height, pitch and gap, on all of which it must "
                        + "depend.")
                .build();
    }

    static Correlation shearRate() {
        return inATube("helicalscrew.ks.in-a-draft-tube", Quantity.SHEAR_RATE_CONSTANT, "in a draft tube")
                .cite(Citation.withoutLocator("tables of Metzner-Otto constants, among them R. P. Chhabra and J. F. Richardson, "
                        + "Non-Newtonian Flow and Applied Rheology, 2nd ed. (2008), chapter 8, Table 8.1; which of them has the "
                        + "screw is not checked"))
                .scatter(0.03)
                .notStated(Classifier.FLUID, "recalled for non-Newtonian fluids, not of which kind")
                .value("ks", 16.5)
                .remark("The middle of 16 to 17.")
                .build();
    }

    private static CorrelationBuilder inATube(String id, Quantity quantity, String title) {
        return Correlation.of(id, quantity, title)
                .families(HelicalScrew.ID)
                .transcription(Transcription.UNSURE)
                .range(Measure.REYNOLDS, Double.NEGATIVE_INFINITY, RegimeLimits.IN_GENERAL.laminarUpTo(),
                        "laminar in words; the end of it is that of impellers in general")
                .inClass(HelicalScrew.SURROUNDINGS, HelicalScrew.IN_A_TUBE)
                .notStated(Classifier.BAFFLING, "recalled without it")
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .notStated(Measure.ratio(Dimensions.DRAFT_TUBE_DIAMETER, Dimensions.IMPELLER_DIAMETER),
                        "recalled without a range");
    }
}
