package stirwright.family.discturbine;

import stirwright.correlation.ChartCurve;
import stirwright.correlation.Citation;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Figures;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** Power number over Reynolds number as read off charts, and the factor for a vessel without baffles. */
final class PowerCurves {

    /** Up to this Reynolds number the surface stays flat and the Froude number does not act. */
    private static final double FROUDE_ACTS_ABOVE = 300;

    private PowerCurves() {}

    static Correlation baffled() {
        return Correlation.of("discturbine.np.baffled-curve", Quantity.POWER_NUMBER,
                        "power curve with baffles, laminar to turbulent")
                .families(DiscTurbine.ID)
                .cite(Citation.withoutLocator("chart of the six-blade disc turbine after J. H. Rushton, E. W. "
                        + "Costich and H. J. Everett, Chem. Eng. Prog. 46 (1950) 395-404, and R. L. Bates, P. L. "
                        + "Fondy and R. R. Corpstein, Ind. Eng. Chem. Process Des. Dev. 2 (1963) 310-314"))
                .transcription(Transcription.FROM_MEMORY)
                .range(Measure.REYNOLDS, 1, 1e5)
                .baffled()
                .oneOf(Measure.BAFFLE_COUNT, 4)
                .range(Measure.B_OVER_T, Sources.NARROW_BAFFLE, Sources.WIDE_BAFFLE, "T/12 to T/10")
                .oneOf(Measure.BLADE_COUNT, 6)
                .nominal(Measure.W_OVER_D, 0.2)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .newtonianData()
                .reads(Variable.REYNOLDS)
                .curve("phi", 1, 70, 5.185, 14, 10, 8.5, 100, 3.6, 400, 3.5, 1000, 4.25, 1e4, 5, 1e5, 5)
                .formula("Np over Re {phi}")
                .relation((vessel, k) -> {
                    ChartCurve phi = k.curve("phi");
                    return point -> phi.at(point.reynolds());
                })
                .remark("The points are recalled, not read again, but for 14 at Re 5.185, which is printed in Geankoplis, Transport "
                        + "Processes and Unit Operations, Example 3.4-1, as is its reference row at Re 5.185e4.")
                .remark("Conflict: a non-Newtonian problem of the same book has 3.1 at Re 27.6, well below this "
                        + "curve; in shear-thinning fluids the drop to the turbulent level comes later.")
                .remark("In shear-thinning fluids power numbers up to 25 to 30 % below this curve are reported between Re 10 and "
                        + "100 to 1000.")
                .remark("Conflict: its level of 5 stands against 5.75 and 6 to 6.3 in tables.")
                .build();
    }

    static Correlation unbaffled() {
        return Correlation.of("discturbine.np.unbaffled-curve", Quantity.POWER_NUMBER,
                        "power curve without baffles, turbulent")
                .families(DiscTurbine.ID)
                .cite(Citation.of("W. L. McCabe, J. C. Smith and P. Harriott, Unit Operations of Chemical "
                        + "Engineering, 5th ed., McGraw-Hill (1993), and R. E. Treybal, Mass-Transfer Operations, "
                        + "3rd ed., McGraw-Hill (1980)",
                        "Example 9.2; Illustration 10.7, p. 525, with Fig. 6.5, curve g, p. 152"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .range(Measure.REYNOLDS, 6.9e4, 2.5e5, "between the two readings, rounded")
                .unbaffled()
                .oneOf(Measure.BLADE_COUNT, 6)
                .notStated(Measure.W_OVER_D, "not given in the two examples")
                .range(Measure.D_OVER_T, 0.3, 0.334)
                .newtonianData()
                .reads(Variable.REYNOLDS)
                .curve("phi", 69_600, 1.07, 240_300, 0.72)
                .formula("Np/Fr^m over Re {phi}")
                .relation((vessel, k) -> {
                    ChartCurve phi = k.curve("phi");
                    return point -> phi.at(point.reynolds());
                })
                .remark("This is Np/Fr^m; the factor Fr^m is a modifier of its own.")
                .remark("The second Reynolds number is computed here from the example's data: 0.15 m, 13.3 rev/s, "
                        + "water with 8.2 % toluene, density 987 kg/m3, viscosity 1.23 mPa s; the vessel is full, so "
                        + "the Froude number does not act in it.")
                .remark("Conflict: a table of Rushton et al. (1950) has 1.15 at Re 1e5, about 20 % above this line.")
                .build();
    }

    static Correlation unbaffledTable() {
        return Correlation.of("discturbine.np.rushton-1950-unbaffled", Quantity.POWER_NUMBER,
                        "Rushton, Costich and Everett, without baffles, table of 1950")
                .families(DiscTurbine.ID)
                .cite(Sources.rushtonTable("columns Re 5, 200 and 1e5"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .range(Measure.REYNOLDS, 5, FROUDE_ACTS_ABOVE,
                        "the table goes on to 1e5, and does not say whether its numbers there are Np or Np/Fr^m")
                .unbaffled()
                .oneOf(Measure.BLADE_COUNT, 6)
                .notStated(Measure.W_OVER_D, Sources.NO_WIDTH)
                .nominal(Measure.D_OVER_T, 1.0 / 3)
                .nominal(Measure.H_OVER_T, 1)
                .nominal(Measure.C_OVER_D, 1)
                .newtonianData()
                .contains(Effect.FROUDE)
                .reads(Variable.REYNOLDS)
                .curve("Np", 5, 14.2, 10, 7.1, 200, 3.7, 1e5, 1.15)
                .formula("Np over Re {Np}")
                .relation((vessel, k) -> {
                    ChartCurve np = k.curve("Np");
                    return point -> np.at(point.reynolds());
                })
                .remark("Three printed points, and 7.1 at Re 10 by the slope -1 that the same page has up to there; the "
                        + "straight lines between them are ours, and the curve between 200 and 1e5 may well be bent.")
                .remark("Were 1.15 at Re 1e5 Np/Fr^m, the power would be 29 % more at Fr 0.08. Taken for Np it agrees with 0.97 Fr^m of "
                        + "the power curve without baffles at Fr 0.14.")
                .build();
    }

    static Correlation froudeFactor() {
        return Correlation.modifier("discturbine.np.froude-rushton-1950", Quantity.POWER_NUMBER, Effect.FROUDE,
                        "surface vortex in a vessel without baffles")
                .families(DiscTurbine.ID)
                .appliesWhen("no baffles", vessel -> vessel.get(Dimensions.BAFFLE_COUNT) == 0)
                .cite(Sources.mccabe("Example 9.2, after Rushton, Costich and Everett (1950)"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .notStated(Measure.REYNOLDS, "no end is given; up to 300 the factor is 1")
                .unbaffled()
                .oneOf(Measure.BLADE_COUNT, 6)
                .nominal(Measure.D_OVER_T, 1.0 / 3)
                .newtonianData()
                .reads(Variable.REYNOLDS, Variable.FROUDE)
                .constant("a", 1)
                .constant("b", 40)
                .formula("Fr^(({a} - log10 Re)/{b}) above Re " + Figures.show(FROUDE_ACTS_ABOVE) + ", 1 up to there")
                .relation((vessel, k) -> {
                    double a = k.get("a");
                    double b = k.get("b");
                    return point -> {
                        double re = point.reynolds();
                        return re > FROUDE_ACTS_ABOVE
                                ? Math.pow(point.get(Variable.FROUDE), (a - Math.log10(re)) / b)
                                : 1;
                    };
                })
                .remark("That m is 0 with baffles and up to Re 300 is read in E. E. Ludwig, Applied Process Design, "
                        + "vol. 1, 3rd ed., note to Fig. 5-16. At 300 the published rule has a step of a few per cent.")
                .build();
    }
}
