package stirwright.family.flatblade;

import stirwright.correlation.ChartCurve;
import stirwright.correlation.Citation;
import stirwright.correlation.Correlation;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** The row of the paddle in Rushton, Costich and Everett's table of 1950, laminar to turbulent. */
final class RushtonTable {

    private RushtonTable() {}

    static Correlation paddle() {
        return Correlation.of("flatblade.np.rushton-1950-paddle", Quantity.POWER_NUMBER,
                        "Rushton, Costich and Everett, two-blade paddle, table of 1950")
                .families(FlatBlade.ID)
                .cite(Citation.of("J. H. Rushton, E. W. Costich and H. J. Everett, Chem. Eng. Prog. 46 (1950) 395-404 and "
                        + "467-476", "p. 472 as printed in D. W. Hendricks, Fundamentals of Water Treatment Unit Processes, CRC "
                        + "Press, Table 10.3, p. 258, columns Re 5, 200 and 1e5"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .range(Measure.REYNOLDS, 5, 1e5)
                .baffled()
                .notStated(Measure.BAFFLE_COUNT, "the table has no column for it")
                .nominal(Measure.B_OVER_T, 0.083)
                .oneOf(Measure.BLADE_COUNT, 2)
                .notStated(Measure.W_OVER_D, "the table has no column for it")
                .nominal(Measure.D_OVER_T, 1.0 / 3)
                .nominal(Measure.H_OVER_T, 1)
                .nominal(Measure.C_OVER_D, 1)
                .newtonianData()
                .reads(Variable.REYNOLDS)
                .curve("Np", 5, 7.3, 10, 3.65, 200, 1.60, 1e5, 1.63)
                .formula("Np over Re {Np}")
                .relation((vessel, k) -> {
                    ChartCurve np = k.curve("Np");
                    return point -> np.at(point.reynolds());
                })
                .remark("Three printed points, and 3.65 at Re 10 by the slope -1 that the same page has up to there; the "
                        + "straight lines between them are ours.")
                .remark("7.3 at Re 5 is 36.5 over Re, McCabe's laminar constant, and 1.63 stands beside his 1.70.")
                .remark("Conflict: Kamei and Hiraoka's equations give about a third more around Re 500.")
                .build();
    }
}
