package invented.contract.sample;

import java.util.List;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.FlowKind;
import stirwright.correlation.Quantity;
import stirwright.correlation.Variable;

/** A flow number, a blend time, and a quantity of this contributor's own; invented. */
final class Others {
    private static final Quantity WEB_LOAD = Quantity.of("web-load", "web load", "Lw", "Pa");
    private static final Variable ROUGHNESS = Variable.of("web_roughness", "web roughness", "rw", "-");

    private Others() {}

    static List<Correlation> all() {
        return List.of(flowNumber(), blendTime(), webLoad());
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
}
