package invented.contract.sample;

import java.util.List;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Variable;

/** Shear-rate constants on all that they may depend on, invented. */
final class ShearRateConstants {

    private ShearRateConstants() {}

    static List<Correlation> all() {
        return List.of(flowIndex(), geometry(), reynolds(), flowNumber());
    }

    private static Correlation flowIndex() {
        return start("flow-index")
                .range(Measure.FLOW_INDEX, 0.2, 1)
                .reads(Variable.FLOW_INDEX)
                .constant("k", 8)
                .formula("ks = {k} (3 n + 1)/(4 n)")
                .relation((g, k) -> p -> {
                    double n = p.get(Variable.FLOW_INDEX);
                    return k.get("k") * (3 * n + 1) / (4 * n);
                })
                .build();
    }

    private static Correlation geometry() {
        return start("geometry")
                .constant("k", 16)
                .formula("ks = {k} (D/T)^0.5")
                .relation((g, k) -> {
                    double ks = k.get("k") * Math.sqrt(g.ratio(Dimensions.IMPELLER_DIAMETER, Dimensions.VESSEL_DIAMETER));
                    return p -> ks;
                })
                .build();
    }

    private static Correlation reynolds() {
        return start("reynolds")
                .reads(Variable.REYNOLDS)
                .constant("k", 10)
                .constant("r", 0.05)
                .formula("ks = {k} Re^{r}")
                .relation((g, k) -> p -> k.get("k") * Math.pow(p.reynolds(), k.get("r")))
                .build();
    }

    private static Correlation flowNumber() {
        return start("flow-number")
                .reads(Variable.FLOW_NUMBER)
                .constant("k", 12)
                .formula("ks = {k} Nq")
                .relation((g, k) -> p -> k.get("k") * p.get(Variable.FLOW_NUMBER))
                .build();
    }

    private static CorrelationBuilder start(String source) {
        return SampleFamily.loose(Correlation.of(
                        "sampleblade.ks.invented-" + source, Quantity.SHEAR_RATE_CONSTANT, "by " + source.replace('-', ' ')))
                .families(SampleFamily.ID);
    }
}
