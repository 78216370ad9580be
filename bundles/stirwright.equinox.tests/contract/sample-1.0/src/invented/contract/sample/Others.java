package invented.contract.sample;

import java.util.List;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.FlowKind;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Variable;

/** A flow number, a blend time, and quantities of this contributor's own; invented. */
final class Others {
    private static final Quantity WEB_LOAD = Quantity.of("web-load", "web load", "Lw", "Pa");
    private static final Variable LOAD = Variable.of(WEB_LOAD);
    private static final Variable ROUGHNESS = Variable.of("web_roughness", "web roughness", "rw", "-");

    private Others() {}

    static List<Correlation> all() {
        return List.of(flowNumber(), blendTime(), webLoad(), webWear(), webDrag(), webLift());
    }

    private static Correlation flowNumber() {
        return SampleFamily.loose(Correlation.of("sampleblade.nq.invented", Quantity.FLOW_NUMBER, "flow number"))
                .families(SampleFamily.ID)
                .flow(FlowKind.CIRCULATION)
                .reads(Variable.REYNOLDS)
                .constant("q", 0.8)
                .constant("r", 50)
                .formula("Nq = {q} Re/(Re + {r})")
                .relation((g, k) -> p -> k.get("q") * p.reynolds() / (p.reynolds() + k.get("r")))
                .build();
    }

    private static Correlation blendTime() {
        return SampleFamily.loose(Correlation.of("sampleblade.blend-time.invented", Quantity.BLEND_TIME, "blend time"))
                .anyFamily()
                .reads(Variable.POWER_NUMBER, Variable.REYNOLDS, Variable.SPEED)
                .constant("c", 6)
                .constant("r", 100)
                .formula("t95 = {c} (T/D)^2 (1 + {r}/Re)/(N Np^(1/3))")
                .relation((g, k) -> {
                    double ratio = g.ratio(Dimensions.VESSEL_DIAMETER, Dimensions.IMPELLER_DIAMETER);
                    double turns = k.get("c") * ratio * ratio;
                    return p -> turns * (1 + k.get("r") / p.reynolds())
                            / (p.get(Variable.SPEED) * Math.cbrt(p.get(Variable.POWER_NUMBER)));
                })
                .build();
    }

    private static Correlation webLoad() {
        return SampleFamily.loose(Correlation.of("sampleblade.web-load.invented", WEB_LOAD, "load on the web"))
                .families(SampleFamily.ID)
                .reads(Variable.DENSITY, Variable.SPEED, ROUGHNESS)
                .constant("L", 0.3)
                .formula("Lw = {L} (1 + rw) rho N^2 D^2")
                .relation((g, k) -> {
                    double d = g.get(Dimensions.IMPELLER_DIAMETER);
                    return p -> k.get("L") * (1 + p.get(ROUGHNESS)) * p.get(Variable.DENSITY)
                            * p.get(Variable.SPEED) * p.get(Variable.SPEED) * d * d;
                })
                .build();
    }

    /** One number. */
    private static Correlation webWear() {
        return SampleFamily.loose(Correlation.of("sampleblade.web-wear.invented",
                        Quantity.of("web-wear", "wear of the web", "Ww", "-"), "wear of the web"))
                .families(SampleFamily.ID)
                .value("w", 0.7)
                .build();
    }

    /** A laminar law, with a word on its limit. */
    private static Correlation webDrag() {
        return SampleFamily.card(Correlation.of("sampleblade.web-drag.invented",
                        Quantity.of("web-drag", "drag of the web", "Cw", "-"), "drag of the web"))
                .families(SampleFamily.ID)
                .range(Measure.REYNOLDS, 0.1, 10, "the family's limit")
                .notStated(Classifier.BAFFLING, "invented without baffles")
                .notStated(Measure.D_OVER_T, "invented without a range")
                .newtonianData()
                .overReynolds("d", 24)
                .build();
    }

    /** Reads the pick of a quantity of this contributor's own. */
    private static Correlation webLift() {
        return SampleFamily.card(Correlation.of("sampleblade.web-lift.invented",
                        Quantity.of("web-lift", "lift of the web", "Cl", "-"), "lift of the web"))
                .families(SampleFamily.ID)
                .turbulent()
                .inClass(Classifier.BAFFLING, Classifier.BAFFLED)
                .notStated(Measure.D_OVER_T, "invented without a range")
                .newtonianData()
                .atMost(SampleFamily.WEB_REYNOLDS, 2000)
                .reads(LOAD)
                .constant("j", 0.01)
                .formula("Cl = {j} Lw")
                .relation((g, k) -> p -> k.get("j") * p.get(LOAD))
                .build();
    }
}
