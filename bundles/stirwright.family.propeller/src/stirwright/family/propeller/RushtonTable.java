package stirwright.family.propeller;

import stirwright.correlation.ChartCurve;
import stirwright.correlation.Citation;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Effect;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** The rows of the propeller in Rushton, Costich and Everett's table of 1950, laminar to turbulent. */
final class RushtonTable {

    private RushtonTable() {}

    static Correlation baffled() {
        return curve("propeller.np.rushton-1950-baffled", "Rushton, Costich and Everett, baffles, table of 1950",
                        5, 8.3, 10, 4.15, 200, 0.77, 1e5, 0.26)
                .range(Measure.REYNOLDS, 5, 1e5)
                .baffled()
                .notStated(Measure.BAFFLE_COUNT, "the table has no column for it")
                .nominal(Measure.B_OVER_T, 0.083)
                .remark("Conflict: 0.32 is usually put down to the same authors for square pitch and baffles, with wider ones.")
                .build();
    }

    static Correlation unbaffled() {
        return curve("propeller.np.rushton-1950-unbaffled", "Rushton, Costich and Everett, no baffles, table of 1950",
                        5, 8.3, 10, 4.15, 200, 0.75, 1e5, 0.22)
                .range(Measure.REYNOLDS, 5, 300,
                        "the table goes on to 1e5, and does not say whether its numbers there are Np or Np/Fr^m")
                .unbaffled()
                .contains(Effect.FROUDE)
                .remark("Up to Re 300 the Froude number does not act. The exponents m of this impeller are not here, since which of "
                        + "those recalled belongs to which vessel is unsure.")
                .remark("Off the centre line and without baffles the table has 0.32 at Re 1e5.")
                .build();
    }

    private static CorrelationBuilder curve(String id, String title, double... points) {
        return Correlation.of(id, Quantity.POWER_NUMBER, title)
                .families(Propeller.ID)
                .cite(Citation.of("J. H. Rushton, E. W. Costich and H. J. Everett, Chem. Eng. Prog. 46 (1950) 395-404 and "
                        + "467-476", "p. 472 as printed in D. W. Hendricks, Fundamentals of Water Treatment Unit Processes, CRC "
                        + "Press, Table 10.3, p. 258, columns Re 5, 200 and 1e5"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .oneOf(Measure.BLADE_COUNT, 3)
                .range(Propeller.PITCH, 1, 1.03, "square pitch, printed as 1.02 and 1.03")
                .nominal(Measure.D_OVER_T, 1.0 / 3)
                .nominal(Measure.H_OVER_T, 1)
                .nominal(Measure.C_OVER_D, 1)
                .newtonianData()
                .reads(Variable.REYNOLDS)
                .curve("Np", points)
                .formula("Np over Re {Np}")
                .relation((vessel, k) -> {
                    ChartCurve np = k.curve("Np");
                    return point -> np.at(point.reynolds());
                })
                .remark("Three printed points, and 4.15 at Re 10 by the slope -1 that the same page has up to there; the "
                        + "straight lines between them are ours, and the curve between 200 and 1e5 may well be bent.");
    }
}
