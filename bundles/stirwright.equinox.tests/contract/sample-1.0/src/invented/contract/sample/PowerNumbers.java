package invented.contract.sample;

import java.util.List;
import stirwright.correlation.ChartCurve;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.FluidClass;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.ReynoldsDefinition;
import stirwright.correlation.Variable;

/** Power numbers, invented. */
final class PowerNumbers {

    private PowerNumbers() {}

    static List<Correlation> all() {
        return List.of(laminarToTurbulent(), withFroude(), ownReynolds());
    }

    /** Uses every kind of bound. */
    private static Correlation laminarToTurbulent() {
        return SampleFamily.card(start("curve", "laminar to turbulent"))
                .families(SampleFamily.ID)
                .range(Measure.REYNOLDS, 0.1, 1e5)
                .inClass(Classifier.BAFFLING, Classifier.BAFFLED, Classifier.UNBAFFLED)
                .range(Measure.D_OVER_T, 0.3, 0.6)
                .fluids(FluidClass.NEWTONIAN, FluidClass.SHEAR_THINNING, FluidClass.YIELD_STRESS)
                .oneOf(Measure.BLADE_COUNT, 2, 4, 6)
                .atLeast(Measure.H_OVER_T, 0.5)
                .atMost(Measure.C_OVER_T, 0.5)
                .nominal(SampleFamily.WEB_OVER_D, 0.125)
                .inClass(SampleFamily.WEB, "narrow")
                .atMost(SampleFamily.WEB_AREA, 0.5)
                .notStated(Measure.VESSEL_DIAMETER, "invented without a scale")
                .contains(Effect.DIAMETER_RATIO, SampleFamily.SLOTS)
                .scatter(0.1)
                .belongsWith("sampleblade.ks.invented-flow-index")
                .laminarLimit()
                .reads(Variable.REYNOLDS)
                .constant("A", 80)
                .constant("B", 0.5)
                .curve("phi", 1, 2, 100, 2, 10_000, 4)
                .formula("Np = {A}/Re + phi(Re) (nB/4)^{B}, phi {phi}")
                .relation((g, k) -> {
                    double a = k.get("A");
                    double blades = Math.pow(g.get(Dimensions.BLADE_COUNT) / 4, k.get("B"));
                    ChartCurve phi = k.curve("phi");
                    return p -> a / p.reynolds() + phi.at(p.reynolds()) * blades;
                })
                .build();
    }

    /** Contains the Froude number, and means the power-law Reynolds number. */
    private static Correlation withFroude() {
        return SampleFamily.loose(start("froude-inside", "Froude number inside"))
                .families(SampleFamily.ID)
                .reynolds(ReynoldsDefinition.POWER_LAW)
                .contains(Effect.FROUDE)
                .reads(Variable.REYNOLDS, Variable.FROUDE)
                .constant("C", 3)
                .constant("c", 0.05)
                .formula("Np = {C} Fr^{c}/log10(10 + Re)")
                .relation((g, k) -> {
                    double c = k.get("C");
                    double exponent = k.get("c");
                    return p -> c * Math.pow(p.get(Variable.FROUDE), exponent) / Math.log10(10 + p.reynolds());
                })
                .build();
    }

    /** Means a Reynolds number that the workbench does not know. */
    private static Correlation ownReynolds() {
        return SampleFamily.loose(start("own-reynolds", "a Reynolds number of its own"))
                .families(SampleFamily.ID)
                .reynolds(ReynoldsDefinition.of("web-based", "rho N w^2/mu"))
                .reads(Variable.REYNOLDS)
                .constant("E", 5)
                .formula("Np = {E}/Re")
                .relation((g, k) -> p -> k.get("E") / p.reynolds())
                .build();
    }

    private static CorrelationBuilder start(String source, String title) {
        return Correlation.of("sampleblade.np.invented-" + source, Quantity.POWER_NUMBER, title);
    }
}
