package stirwright.family.discturbine;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** Turbulent power numbers that textbooks use or quote, one number each. */
final class Handbooks {

    private Handbooks() {}

    static Correlation geankoplis() {
        return sixBlades("discturbine.np.geankoplis-level", "Geankoplis, level of the chart")
                .cite(Citation.of("C. J. Geankoplis, Transport Processes and Unit Operations, 3rd ed.",
                        "Example 3.4-1, p. 145; also R. E. Treybal, Mass-Transfer Operations, 3rd ed., Illustrations 6.2, "
                        + "11.3 to 11.5"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .range(Measure.REYNOLDS, 5.1e4, 4.7e5, "the two readings whose Reynolds number is known, rounded")
                .baffled()
                .oneOf(Measure.BAFFLE_COUNT, 4)
                .nominal(Measure.B_OVER_T, 1.0 / 12)
                .nominal(Measure.W_OVER_D, 0.2)
                .nominal(Measure.D_OVER_T, 1.0 / 3)
                .value("Np", 5)
                .remark("The dimensions are Geankoplis's; those of Treybal's vessels were not read. The second Reynolds "
                        + "number is computed here: 0.305 m, 5 rev/s, water of 1 mPa s.")
                .remark("Conflict: McCabe, Smith and Harriott have 5.75, Laity and Treybal 5.7, Harriott 6.")
                .build();
    }

    static Correlation harriott() {
        return sixBlades("discturbine.np.harriott", "Harriott, turbulent")
                .cite(Citation.of("P. Harriott, Chemical Reactor Design, Marcel Dekker (2003)", "Example 7.6"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .turbulent()
                .baffled()
                .notStated(Measure.BAFFLE_COUNT, "not read in the example")
                .notStated(Measure.W_OVER_D, "not read in the example")
                .notStated(Measure.D_OVER_T, "not read in the example")
                .value("Np", 6)
                .remark("Conflict: McCabe, Smith and Harriott have 5.75, charts 5.")
                .build();
    }

    static Correlation laityTreybal() {
        return sixBlades("discturbine.np.laity-treybal-1957", "Laity and Treybal")
                .cite(Citation.withoutLocator("D. S. Laity and R. E. Treybal (1957), as quoted"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .turbulent()
                .notStated(Classifier.BAFFLING, "quoted without it")
                .notStated(Measure.W_OVER_D, "quoted without it")
                .notStated(Measure.D_OVER_T, "quoted without it")
                .value("Np", 5.7)
                .remark("Within 1 % of McCabe, Smith and Harriott's 5.75.")
                .build();
    }

    private static CorrelationBuilder sixBlades(String id, String title) {
        return Correlation.of(id, Quantity.POWER_NUMBER, title)
                .families(DiscTurbine.ID)
                .oneOf(Measure.BLADE_COUNT, 6)
                .newtonianData();
    }
}
