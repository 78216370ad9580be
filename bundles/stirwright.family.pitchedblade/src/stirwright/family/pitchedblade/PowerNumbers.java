package stirwright.family.pitchedblade;

import stirwright.correlation.ChartCurve;
import stirwright.correlation.Citation;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** Power numbers with baffles; those without baffles hold for paddles in general and stand there. */
final class PowerNumbers {

    private PowerNumbers() {}

    static Correlation mccabeLaminar() {
        return Correlation.of("pitchedblade.np.mccabe-laminar", Quantity.POWER_NUMBER,
                        "McCabe, Smith and Harriott, laminar")
                .families(PitchedBlade.ID)
                .cite(Sources.mccabe("chapter 9, table of K_L and K_T, headed: "
                        + "four baffles a tenth of the vessel wide (heading from memory)"))
                .transcription(Transcription.FROM_MEMORY)
                .atMost(Measure.REYNOLDS, 10)
                .baffled(4, 0.1)
                .oneOf(Measure.BLADE_COUNT, 4)
                .nominal(Measure.BLADE_ANGLE, 45)
                .nominal(Measure.W_OVER_D, 0.2)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .newtonianData()
                .overReynolds("KL", 44.5)
                .remark("Kamei and Hiraoka's equations give 47.0 for this impeller at D/T 1/3, 6 % more.")
                .remark("In laminar flow baffles do not act.")
                .build();
    }

    static Correlation mccabeTurbulent() {
        return Correlation.of("pitchedblade.np.mccabe-turbulent", Quantity.POWER_NUMBER,
                        "McCabe, Smith and Harriott, turbulent")
                .families(PitchedBlade.ID)
                .cite(Sources.mccabe("Example 9.5; the baffles by the heading of the table "
                        + "of K_L and K_T in chapter 9, from memory"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .atLeast(Measure.REYNOLDS, 1e4)
                .baffled(4, 0.1)
                .oneOf(Measure.BLADE_COUNT, 4)
                .nominal(Measure.BLADE_ANGLE, 45)
                .nominal(Measure.W_OVER_D, 0.2)
                .notStated(Measure.D_OVER_T, "no range; the worked example has 1/3")
                .newtonianData()
                .contains(Effect.LIQUID_DEPTH)
                .value("KT", 1.27)
                .remark("The example uses it at H/T 4/3 as it is.")
                .remark("Conflict: Dickey has 1.37 for the same impeller.")
                .build();
    }

    static Correlation dickeyHicks() {
        return Correlation.of("pitchedblade.np.dickey-hicks", Quantity.POWER_NUMBER,
                        "Dickey, blade width; Hicks, Morton and Fenic, viscosity")
                .families(PitchedBlade.ID)
                .cite(Citation.of("D. S. Dickey in Handbook of Chemical Engineering Calculations, McGraw-Hill, and R. W. "
                        + "Hicks, J. R. Morton and J. G. Fenic, Chem. Eng., 26 April 1976, p. 104",
                        "section 12.1; table as printed in E. E. Ludwig, Applied Process Design, vol. 1, 3rd ed., p. 300"))
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .atLeast(Measure.REYNOLDS, 50)
                .baffled()
                .notStated(Measure.BAFFLE_COUNT, "not read in the section")
                .oneOf(Measure.BLADE_COUNT, 4)
                .nominal(Measure.BLADE_ANGLE, 45)
                .notStated(Measure.W_OVER_D, "scaled from 1/5 by the formula, without a range")
                .notStated(Measure.D_OVER_T, "no range is given")
                .newtonianData()
                .reads(Variable.REYNOLDS)
                .constant("Npt", 1.37)
                .constant("w", 0.2)
                .constant("e", 1.25)
                .curve("Cf", 50, 0.87, 60, 0.88, 70, 0.89, 100, 0.91, 200, 0.95, 400, 0.98, 700, 1, 1000, 1)
                .constant("q", 5)
                .formula("Np = {Npt} ((W/D)/{w})^{e} / Cf^{q}, Cf over Re {Cf}, level beyond")
                .relation((vessel, k) -> {
                    double turbulent = k.get("Npt") * Math.pow(
                            vessel.ratio(Dimensions.BLADE_WIDTH, Dimensions.IMPELLER_DIAMETER) / k.get("w"), k.get("e"));
                    ChartCurve cf = k.curve("Cf");
                    double q = k.get("q");
                    return point -> turbulent / Math.pow(cf.at(point.reynolds()), q);
                })
                .remark("The table corrects the turbine diameter; that the power number goes with the inverse fifth "
                        + "power of it, from P proportional to D^5 at equal power, is derived here, so its numbers are not "
                        + "printed as such. The table's own formula for the diameter gives back 1.37 at 85 % of the motor.")
                .remark("The table ends at Re 700 with the factor 1; the point at 1000 is ours and keeps it there.")
                .remark("Conflict: McCabe, Smith and Harriott have 1.27 for W/D 1/5.")
                .remark("Blade width: Bates et al. (1963) have exponents from 1.0 to 1.25.")
                .remark("Conflict: for the blade width Hiraoka et al. (1997) have the exponent 1.")
                .build();
    }

    static Correlation medek() {
        return Correlation.of("pitchedblade.np.medek-1980", Quantity.POWER_NUMBER, "Medek")
                .families(PitchedBlade.ID)
                .cite(Citation.of("J. Medek, Int. Chem. Eng. 20 (1980)", "p. 664"))
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .atLeast(Measure.REYNOLDS, 1e4)
                .baffled(4, 0.1)
                .notStated(Measure.BLADE_COUNT, "recalled as 3 to 12, unsure")
                .range(Measure.BLADE_ANGLE, 15, 45)
                .nominal(Measure.W_OVER_D, 0.2)
                .range(Measure.D_OVER_T, 0.166, 0.417)
                .notStated(Measure.C_OVER_D, "recalled as 0.5 to 1.5, unsure")
                .notStated(Measure.H_OVER_T, "recalled without a range, though the formula has it")
                .newtonianData()
                .contains(Effect.CLEARANCE, Effect.DIAMETER_RATIO, Effect.LIQUID_DEPTH)
                .constant("a", 1.507)
                .constant("b", 0.701)
                .constant("c", 0.165)
                .constant("d", 0.365)
                .constant("e", 0.140)
                .constant("f", 2.077)
                .formula("Np = {a} nB^{b} (C/D)^-{c} (T/D)^-{d} (H/T)^{e} (sin angle)^{f}")
                .relation((vessel, k) -> {
                    double np = k.get("a")
                            * Math.pow(vessel.get(Dimensions.BLADE_COUNT), k.get("b"))
                            * Math.pow(vessel.ratio(Dimensions.CLEARANCE, Dimensions.IMPELLER_DIAMETER), -k.get("c"))
                            * Math.pow(vessel.ratio(Dimensions.VESSEL_DIAMETER, Dimensions.IMPELLER_DIAMETER), -k.get("d"))
                            * Math.pow(vessel.ratio(Dimensions.LIQUID_HEIGHT, Dimensions.VESSEL_DIAMETER), k.get("e"))
                            * Math.pow(Math.sin(vessel.get(Dimensions.BLADE_ANGLE)), k.get("f"));
                    return point -> np;
                })
                .remark("For four blades at 45 degrees it gives 1.30, between 1.27 (McCabe) and 1.37 (Dickey); Hiraoka et al. "
                        + "(1997) are 4 % above it at 45 degrees and 15 % below it at 30, at D/T 1/3 and C/D 1.")
                .remark("Blade count: Hiraoka et al. have the exponent 0.7 too. For the clearance no second source is at hand.")
                .remark("Conflict: for the blade count Bates et al. (1963) have the exponent 0.8, for three to six blades, and for "
                        + "the angle the sine to 2.6.")
                .remark("Conflict: for D/T a form of Kumaresan and Joshi (2006), recalled and unsure, has (T/D)^0.11, which goes "
                        + "the other way.")
                .build();
    }

    static Correlation harriott() {
        return Correlation.of("pitchedblade.np.harriott-six-blades", Quantity.POWER_NUMBER,
                        "Harriott, six blades, turbulent")
                .families(PitchedBlade.ID)
                .cite(Citation.of("P. Harriott, Chemical Reactor Design, Marcel Dekker (2003)", "Example 7.6"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .turbulent()
                .baffled()
                .notStated(Measure.BAFFLE_COUNT, "not read in the example")
                .oneOf(Measure.BLADE_COUNT, 6)
                .nominal(Measure.BLADE_ANGLE, 45)
                .notStated(Measure.W_OVER_D, "not read in the example")
                .notStated(Measure.D_OVER_T, "not read in the example")
                .newtonianData()
                .value("Npt", 1.7)
                .remark("Conflict: other tables have 1.62 to 1.64 for W/D 1/5 and, unsure, 1.3 to 1.4 for W/D 1/8.")
                .build();
    }
}
