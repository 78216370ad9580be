package stirwright.family.propeller;

import stirwright.correlation.ChartCurve;
import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** Power numbers of the turbulent regime, by pitch. */
final class TurbulentPower {

    private TurbulentPower() {}

    static Correlation square() {
        return row("pitch-1", "square pitch", 1)
                .cite(Sources.mccabe("chapter 9, table of K_L and K_T"))
                .transcription(Transcription.FROM_MEMORY)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .value("KT", 0.32)
                .remark("Conflict: Doran has 0.35. Rushton et al. (1950) print 0.26 at Re 1e5 with baffles of T/12, "
                        + "though 0.32 is usually put down to them.")
                .build();
    }

    static Correlation doran() {
        return Correlation.of("propeller.np.doran", Quantity.POWER_NUMBER, "Doran, propeller, turbulent")
                .families(Propeller.ID)
                .cite(Citation.withoutLocator("P. M. Doran, Bioprocess Engineering Principles, Academic Press (1995), "
                        + "example of the power for mixing"))
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .turbulent()
                .notStated(Classifier.BAFFLING, "the example is recalled without it")
                .notStated(Measure.BLADE_COUNT, "the example is recalled without it")
                .notStated(Propeller.PITCH, "the example is recalled without it; the number goes with square pitch")
                .notStated(Measure.D_OVER_T, "the example is recalled without the vessel")
                .newtonianData()
                .value("Np", 0.35)
                .remark("It leads to the 83 kW of the example: 1.3 m, 4 rev/s, 1000 kg/m3, Re 6.76e5.")
                .remark("Conflict: McCabe, Smith and Harriott have 0.32.")
                .build();
    }

    static Correlation earle() {
        return Correlation.of("propeller.np.earle-curve", Quantity.POWER_NUMBER, "power curve in Earle's food text")
                .families(Propeller.ID)
                .cite(Sources.earle("problems 3 and 4 of chapter 12, answers read off the chart of power numbers"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .range(Measure.REYNOLDS, 5141, 4.5e5, "the two readings")
                .notStated(Classifier.BAFFLING, "not given in the two problems")
                .notStated(Measure.BLADE_COUNT, "not given in the two problems")
                .notStated(Propeller.PITCH, "not given in the two problems")
                .nominal(Measure.D_OVER_T, 0.5)
                .newtonianData()
                .reads(Variable.REYNOLDS)
                .curve("phi", 5141, 0.4, 4.5e5, 0.3)
                .formula("Np over Re {phi}")
                .relation((vessel, k) -> {
                    ChartCurve phi = k.curve("phi");
                    return point -> phi.at(point.reynolds());
                })
                .remark("Read for water and for olive oil, 0.3 m at 5 rev/s; the straight line between the two is ours.")
                .remark("At Re 1e5 it gives 0.33, between 0.32 (McCabe) and 0.35 (Doran).")
                .build();
    }

    static Correlation oneAndAHalf() {
        return row("pitch-1-5", "pitch 1.5", 1.5)
                .cite(Sources.mccabeSomeEdition())
                .transcription(Transcription.FROM_MEMORY)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .value("KT", 0.87)
                .remark("The Handbook of Industrial Mixing is recalled, unsure, to have 0.9.")
                .build();
    }

    static Correlation two() {
        return row("pitch-2", "pitch 2", 2)
                .cite(Sources.mccabeSomeEdition())
                .transcription(Transcription.FROM_MEMORY)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .value("KT", 1)
                .build();
    }

    /** What the rows of the table share. */
    private static CorrelationBuilder row(String id, String title, double pitch) {
        return Correlation.of("propeller.np.mccabe-turbulent-" + id, Quantity.POWER_NUMBER,
                        "McCabe, Smith and Harriott, " + title + ", turbulent")
                .families(Propeller.ID)
                .atLeast(Measure.REYNOLDS, 1e4)
                .baffled(4, 0.1)
                .oneOf(Measure.BLADE_COUNT, 3)
                .nominal(Propeller.PITCH, pitch)
                .newtonianData();
    }
}
