package stirwright.general;

import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Geometry;
import stirwright.correlation.Measure;

/** Liquid deeper or shallower than the vessel diameter at which tables were measured. */
final class LiquidDepth {

    private LiquidDepth() {}

    static Correlation pitchedBlade() {
        return MedekTrend.declare("general.np.medek-depth", Effect.LIQUID_DEPTH, "liquid depth with a pitched-blade turbine, Medek",
                        "one impeller, liquid height not about T", LiquidDepth::hOverT)
                .notStated(Measure.H_OVER_T, "recalled without a range")
                .constant("e", 0.140)
                .formula(TurbulentFactor.formula("(H/T)^{e}", "1"))
                .relation((vessel, k) -> TurbulentFactor.of(Math.pow(hOverT(vessel), k.get("e")), 1))
                .remark("Below H/T of 0.6 to 0.7 changes of 5 to 20 % are reported for impellers in general.")
                .build();
    }

    private static double hOverT(Geometry vessel) {
        return vessel.ratio(Dimensions.LIQUID_HEIGHT, Dimensions.VESSEL_DIAMETER);
    }
}
