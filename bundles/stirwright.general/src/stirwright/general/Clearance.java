package stirwright.general;

import stirwright.correlation.Citation;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Geometry;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** An impeller nearer to the bottom than the third of the vessel diameter at which tables were measured, or farther. */
final class Clearance {

    /** At this C/T the flow of a disc turbine begins to change from two loops to one. */
    private static final double ONE_LOOP_BEGINS = 0.2;

    private Clearance() {}

    static Correlation discTurbine() {
        return TurbulentFactor.declare(Correlation.modifier("general.np.low-disc-turbine", Quantity.POWER_NUMBER,
                        Effect.CLEARANCE, "disc turbine near the bottom"))
                .families("discturbine")
                .appliesWhen("one impeller less than 0.2 T above the bottom, baffles", vessel -> MedekTrend.oneBaffled(vessel)
                        && cOverT(vessel) < ONE_LOOP_BEGINS)
                .cite(Citation.withoutLocator(SeveralImpellers.BATES
                        + ", and later work on the change of flow pattern; which prints these numbers is not checked"))
                .transcription(Transcription.FROM_MEMORY)
                .scatter(0.035)
                .baffled()
                .notStated(Measure.C_OVER_T, "it acts below 0.2 alone, and no lower end is recalled")
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .constant("a", 0.725)
                .constant("b", 0.15)
                .constant("c", ONE_LOOP_BEGINS)
                .formula(TurbulentFactor.formula("times {a} up to C/T {b}, from there straight to 1 at C/T {c};", "1"))
                .relation((vessel, k) -> {
                    double share = (cOverT(vessel) - k.get("b")) / (k.get("c") - k.get("b"));
                    double factor = k.get("a") + (1 - k.get("a")) * Math.max(0, Math.min(1, share));
                    return TurbulentFactor.of(factor, 1);
                })
                .remark("Below C/T of about 0.15 to 0.2 the two loops of a disc turbine become one and the power number "
                        + "falls by 25 to 30 %; 27.5 % is the middle, and the straight line between 0.15 and 0.2 is ours.")
                .remark("Between 0.15 and 0.2 either pattern may be found: size a drive there for the power without this "
                        + "factor.")
                .build();
    }

    static Correlation pitchedBlade() {
        return MedekTrend.declare("general.np.medek-clearance", Effect.CLEARANCE, "clearance of a pitched-blade turbine, Medek",
                        "one impeller not about T/3 above the bottom", vessel -> 3 * cOverT(vessel))
                .range(Measure.C_OVER_D, 0.5, 1.5, "recalled, unsure")
                .constant("c", 0.165)
                .formula(TurbulentFactor.formula("(C/(T/3))^-{c}", "1"))
                .relation((vessel, k) -> TurbulentFactor.of(Math.pow(3 * cOverT(vessel), -k.get("c")), 1))
                .build();
    }

    private static double cOverT(Geometry vessel) {
        return vessel.ratio(Dimensions.CLEARANCE, Dimensions.VESSEL_DIAMETER);
    }
}
