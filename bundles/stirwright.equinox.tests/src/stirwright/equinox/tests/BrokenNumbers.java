package stirwright.equinox.tests;

import static stirwright.equinox.tests.Specimen.KS;
import static stirwright.equinox.tests.Specimen.KS_ROW;
import static stirwright.equinox.tests.Specimen.POWER;
import static stirwright.equinox.tests.Specimen.POWER_ROW;
import static stirwright.equinox.tests.Specimen.sound;
import static stirwright.equinox.tests.Specimen.subject;

import java.util.List;
import stirwright.conformance.Subject;
import stirwright.core.Catalogue;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Relation;
import stirwright.correlation.Variable;
import stirwright.equinox.tests.BrokenContributionsTest.Broken;

/** Correlations whose code does something else than they say. Each meets its reference row at Re 100. */
final class BrokenNumbers {

    /** 60/100 + 3 * 1.5/3 where the flow index acts. */
    private static final String WITH_FLOW_INDEX = Specimen.row(POWER, "formula,2.1,by hand", "100,0.3333333333,");

    private BrokenNumbers() {}

    static List<Broken> all() {
        return List.of(
                power("finite", "negative within its range",
                        (g, k) -> p -> k.get("a") / p.reynolds() + k.get("b") * (p.reynolds() < 9e4 ? 1 : -1), "gives -1.49"),
                power("finite", "no number within its range",
                        (g, k) -> p -> p.reynolds() < 2 ? Double.NaN : k.get("a") / p.reynolds() + k.get("b"), "unknown"),
                power("finite", "throws within its range", throwingAbove(9e4), "within", "throws", "too large"),
                power("finite", "throws beyond its range", throwingAbove(2e5), "beyond", "throws", "too large"),
                power("finite", "negative at the other class that it allows", (g, k) -> p -> k.get("a") / p.reynolds()
                        + k.get("b") * (g.get(Dimensions.BAFFLE_COUNT) > 0 ? 1 : -1), "gives -0.9"),
                // 1 at D/T 1/3, -2 at 1/2
                power("finite", "negative at the end of a range of dimensions", (g, k) -> p -> k.get("a") / p.reynolds()
                        + k.get("b") * (7 - 18 * g.ratio(Dimensions.IMPELLER_DIAMETER, Dimensions.VESSEL_DIAMETER)),
                        "gives -"),
                new Broken("flagged", "a measure that does not follow", measured(Measure.of("capped", "capped",
                        (g, p) -> Math.min(p.reynolds(), 1e5))), "'capped 1 to 100000'"),
                power("not clamped", "held above", (g, k) -> p -> k.get("a") / Math.min(p.reynolds(), 1e5) + k.get("b"),
                        "100000"),
                power("not clamped", "held below", (g, k) -> p -> k.get("a") / Math.max(p.reynolds(), 1) + k.get("b"),
                        "at 1;"),
                new Broken("not clamped", "a dimension held", aDimensionHeld(), "D/T"),
                new Broken("laminar limit", "a slope of its own", subject(POWER_ROW, Specimen.power().laminarLimit()
                        .relation((g, k) -> p -> k.get("a") / 100 * Math.pow(100 / p.reynolds(), 0.9) + k.get("b"))
                        .build()), POWER, "laminar"),
                new Broken("laminar limit", "a slope of its own in the second family", aSlopeInTheSecondFamily(),
                        POWER, "laminar"),
                new Broken("reads", "a variable that is not declared", subject(WITH_FLOW_INDEX, Specimen.power()
                        .relation((g, k) -> p -> k.get("a") / p.reynolds() + 3 * k.get("b") * p.get(Variable.FLOW_INDEX))
                        .build()), "flow index", "declaring"),
                new Broken("reads", "a variable that is declared only", subject(WITH_FLOW_INDEX,
                        sound(Specimen.power().reads(Variable.FLOW_INDEX))), "flow index", "never"),
                power("constants", "a digit in the code", (g, k) -> p -> k.get("a") / p.reynolds() + 1.5,
                        "'b'", "no value"),
                new Broken("constants", "a curve that is not used", subject(KS_ROW, shearRate()
                        .curve("c", 1, 11, 10, 11).formula("ks = {c}").relation((g, k) -> p -> 11).build()),
                        KS, "'c'", "no value"),
                // The row has impeller count 1, of which every power is 1.
                new Broken("constants", "an exponent that no row holds", subject(POWER_ROW, Specimen.bounded(
                                Specimen.described(Specimen.start())).constant("a", 2.1).constant("e", 0.5)
                        .notStated(Measure.IMPELLER_COUNT, "invented without a range")
                        .formula("Np = {a} ni^{e}").relation((g, k) -> p -> k.get("a")
                                * Math.pow(g.get(Dimensions.IMPELLER_COUNT), k.get("e"))).build()),
                        POWER, "'e'", "no reference row"),
                new Broken("constants", "a weak term under a wide tolerance", subject(Specimen.row(POWER,
                        "chart,2.1,off a chart", "100,,"), sound(Specimen.power())), POWER, "'a'", "no reference row"));
    }

    private static Broken power(String check, String what, Relation relation, String... words) {
        return new Broken(check, what, subject(POWER_ROW, Specimen.power().relation(relation).build()), words);
    }

    /** Three times D/T is 1 where D is 0.3 m and T the default of 3 D. */
    private static Subject aDimensionHeld() {
        return subject(POWER_ROW, Specimen.power().relation((g, k) -> p -> (k.get("a") / p.reynolds() + k.get("b"))
                * 3 * Math.min(0.5, g.ratio(Dimensions.IMPELLER_DIAMETER, Dimensions.VESSEL_DIAMETER))).build());
    }

    /** The second family alone has blades. */
    private static Subject aSlopeInTheSecondFamily() {
        List<Family> families = List.of(Specimen.family("specimen").build(),
                Specimen.family("second").parameter(Dimensions.BLADE_COUNT.usually("6", g -> 6)).build());
        Correlation sloped = Specimen.power().families("second").laminarLimit()
                .notStated(Measure.BLADE_COUNT, "invented without a range").relation((g, k) -> {
            double slope = g.get(Dimensions.BLADE_COUNT) > 0 ? 0.9 : 1;
            return p -> k.get("a") / 100 * Math.pow(100 / p.reynolds(), slope) + k.get("b");
        }).build();
        String rows = POWER_ROW.replace(",,formula", ",specimen,formula")
                + POWER_ROW.replace(",,formula", ",second,formula");
        return subject(families, Specimen.HEADER + rows, Catalogue.of(List.of()), sloped);
    }

    private static Relation throwingAbove(double reynolds) {
        return (g, k) -> p -> {
            if (p.reynolds() > reynolds) {
                throw new IllegalArgumentException("too large");
            }
            return k.get("a") / p.reynolds() + k.get("b");
        };
    }

    private static Subject measured(Measure measure) {
        return subject(POWER_ROW, sound(Specimen.power().range(measure, 1, 1e5)));
    }

    private static CorrelationBuilder shearRate() {
        return Specimen.bounded(Specimen.described(Correlation.of(KS, Quantity.SHEAR_RATE_CONSTANT, "invented")));
    }
}
