package invented.contract.sample;

import java.util.List;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Quantity;
import stirwright.correlation.Variable;

/** Factors on the power number, invented. */
final class Modifiers {

    private Modifiers() {}

    static List<Correlation> all() {
        return List.of(froude(), severalImpellers(), slots());
    }

    private static Correlation froude() {
        return start("froude", Effect.FROUDE)
                .appliesWhen("no baffles", g -> g.get(Dimensions.BAFFLE_COUNT) == 0)
                .reads(Variable.FROUDE)
                .constant("m", 0.1)
                .formula("Fr^-{m}")
                .relation((g, k) -> {
                    double exponent = -k.get("m");
                    return p -> Math.pow(p.get(Variable.FROUDE), exponent);
                })
                .build();
    }

    private static Correlation severalImpellers() {
        return start("several", Effect.SEVERAL_IMPELLERS)
                .appliesWhen("more than one impeller", g -> g.get(Dimensions.IMPELLER_COUNT) > 1)
                .constant("e", 0.9)
                .formula("ni^{e}")
                .relation((g, k) -> {
                    double factor = Math.pow(g.get(Dimensions.IMPELLER_COUNT), k.get("e"));
                    return p -> factor;
                })
                .build();
    }

    /** For an effect of this contributor's own. */
    private static Correlation slots() {
        return start("slots", SampleFamily.SLOTS)
                .appliesWhen("slots in the web", g -> g.get(SampleFamily.SLOT_COUNT) > 0)
                .constant("s", 0.02)
                .formula("1 - {s} ns")
                .relation((g, k) -> {
                    double factor = 1 - k.get("s") * g.get(SampleFamily.SLOT_COUNT);
                    return p -> factor;
                })
                .build();
    }

    private static CorrelationBuilder start(String source, Effect effect) {
        return SampleFamily.loose(Correlation.modifier(
                        "sampleblade.np.invented-factor-" + source, Quantity.POWER_NUMBER, effect, effect.title()))
                .families(SampleFamily.ID);
    }
}
