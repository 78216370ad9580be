package stirwright.family.discturbine;

import stirwright.correlation.Citation;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** Power numbers of the turbulent regime with baffles: independent of the Reynolds number. */
final class TurbulentPower {

    private TurbulentPower() {}

    static Correlation mccabe() {
        return Correlation.of("discturbine.np.mccabe-turbulent", Quantity.POWER_NUMBER,
                        "McCabe, Smith and Harriott, turbulent")
                .families(DiscTurbine.ID)
                .cite(Sources.mccabe("Example 9.6; the baffles by the heading of the table "
                        + "of K_L and K_T in chapter 9, from memory"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .atLeast(Measure.REYNOLDS, 1e4)
                .baffled(4, 0.1)
                .oneOf(Measure.BLADE_COUNT, 6)
                .nominal(Measure.W_OVER_D, 0.2)
                .nominal(Measure.L_OVER_D, 0.25)
                .notStated(Measure.D_OVER_T, "no range; the worked example has 1/3")
                .newtonianData()
                .value("KT", 5.75)
                .remark("Conflict: charts have 5, Rushton et al. 6 to 6.3, Harriott 6, Laity and Treybal 5.7; "
                        + "blade and disc thickness account for part of it, see Bujalski et al.")
                .build();
    }

    static Correlation rushton() {
        return Correlation.of("discturbine.np.rushton-1950-turbulent", Quantity.POWER_NUMBER,
                        "Rushton, Costich and Everett, turbulent, as in older tables")
                .families(DiscTurbine.ID)
                .cite(Sources.rushton(Citation.LOCATOR_NOT_AT_HAND))
                .transcription(Transcription.FROM_MEMORY)
                .atLeast(Measure.REYNOLDS, 1e4)
                .baffled()
                .oneOf(Measure.BAFFLE_COUNT, 4)
                .range(Measure.B_OVER_T, Sources.NARROW_BAFFLE, Sources.WIDE_BAFFLE)
                .oneOf(Measure.BLADE_COUNT, 6)
                .nominal(Measure.W_OVER_D, 0.2)
                .nominal(Measure.L_OVER_D, 0.25)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .newtonianData()
                .value("KT", 6.3)
                .remark("Conflict: a public transcription of the authors' table has 6.0, for baffles of T/12; "
                        + "McCabe, Smith and Harriott have 5.75.")
                .build();
    }

    static Correlation rushtonFourBlades() {
        return rushtonTable("discturbine.np.rushton-1950-table-four", "four", 4).value("K", 4.3).build();
    }

    static Correlation rushtonSixBlades() {
        return rushtonTable("discturbine.np.rushton-1950-table", "six", 6)
                .value("K", 6.0)
                .remark("Conflict: older tables have 6.3 for the same work.")
                .build();
    }

    static Correlation rushtonTwelveBlades() {
        return rushtonTable("discturbine.np.rushton-1950-table-twelve", "twelve", 12).value("K", 9.9).build();
    }

    private static CorrelationBuilder rushtonTable(String id, String blades, int count) {
        return Correlation.of(id, Quantity.POWER_NUMBER,
                        "Rushton, Costich and Everett, turbulent, table of 1950, " + blades + " blades")
                .families(DiscTurbine.ID)
                .cite(Sources.rushtonTable("column Re 1e5"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .atLeast(Measure.REYNOLDS, 1e5)
                .baffled()
                .nominal(Measure.B_OVER_T, 1.0 / 12)
                .oneOf(Measure.BLADE_COUNT, count)
                .notStated(Measure.W_OVER_D, Sources.NO_WIDTH)
                .nominal(Measure.D_OVER_T, 1.0 / 3)
                .nominal(Measure.H_OVER_T, 1)
                .nominal(Measure.C_OVER_D, 1)
                .newtonianData()
                .contains(Effect.BLADE_COUNT)
                .remark("The column stands for the level part of the curve.");
    }

    static Correlation bujalski() {
        return Correlation.of("discturbine.np.bujalski-1987", Quantity.POWER_NUMBER,
                        "Bujalski et al., thickness and scale")
                .families(DiscTurbine.ID)
                .cite(Citation.withoutLocator("W. Bujalski, A. W. Nienow, S. Chatwin and M. Cooke, "
                        + "Chem. Eng. Sci. 42 (1987) 317-326"))
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .turbulent()
                .baffled()
                .notStated(Measure.BAFFLE_COUNT, "the paper's baffles are not at hand")
                .oneOf(Measure.BLADE_COUNT, 6)
                .nominal(Measure.W_OVER_D, 0.2)
                .nominal(Measure.L_OVER_D, 0.25)
                .notStated(Measure.D_OVER_T, "the paper's range is not at hand")
                .notStated(Measure.THICKNESS_OVER_D, "the paper's range is not at hand; checked from 0.01 to 0.03")
                .notStated(Measure.VESSEL_DIAMETER, "the paper's range is not at hand")
                .newtonianData()
                .contains(Effect.THICKNESS)
                .constant("a", 2.512)
                .constant("b", 0.195)
                .constant("c", 0.063)
                .formula("Np = {a} (t/D)^-{b} (T/T0)^{c}, T0 = 1 m")
                .relation((vessel, k) -> {
                    double thickness = vessel.ratio(Dimensions.BLADE_THICKNESS, Dimensions.IMPELLER_DIAMETER);
                    double metres = vessel.get(Dimensions.VESSEL_DIAMETER);
                    double np = k.get("a") * Math.pow(thickness, -k.get("b")) * Math.pow(metres, k.get("c"));
                    return point -> np;
                })
                .remark("Within 6 % of Rutherford et al. for t/D 0.01 to 0.03 in a vessel of 0.3 m; Nienow and Miles (1971) "
                        + "found the same direction.")
                .build();
    }

    static Correlation rutherford() {
        return Correlation.of("discturbine.np.rutherford-1996", Quantity.POWER_NUMBER,
                        "Rutherford et al., thickness")
                .families(DiscTurbine.ID)
                .cite(Citation.of("K. Rutherford, S. M. S. Mahmoudi, K. C. Lee and M. Yianneskis, "
                        + "Chem. Eng. Res. Des. 74A (1996)", "p. 369"))
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .turbulent()
                .baffled()
                .notStated(Measure.BAFFLE_COUNT, "the paper's baffles are not at hand")
                .oneOf(Measure.BLADE_COUNT, 6)
                .nominal(Measure.W_OVER_D, 0.2)
                .nominal(Measure.L_OVER_D, 0.25)
                .notStated(Measure.D_OVER_T, "the paper's range is not at hand")
                .range(Measure.THICKNESS_OVER_D, 0.008, 0.034)
                .newtonianData()
                .contains(Effect.THICKNESS)
                .constant("a", 6.405)
                .constant("b", 55.673)
                .formula("Np = {a} - {b} t/D")
                .relation((vessel, k) -> {
                    double np = k.get("a")
                            - k.get("b") * vessel.ratio(Dimensions.BLADE_THICKNESS, Dimensions.IMPELLER_DIAMETER);
                    return point -> np;
                })
                .remark("Within 6 % of Bujalski et al. for t/D 0.01 to 0.03 in a vessel of 0.3 m.")
                .build();
    }
}
