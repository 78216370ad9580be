package stirwright.core;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.UnaryOperator;
import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.FlowKind;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Relation;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;
import stirwright.rheology.Fluid;
import stirwright.rheology.FluidModel;
import stirwright.rheology.MeasuredWindow;
import stirwright.rheology.Newtonian;

/** An invented family and builders for invented correlations and cases; every number is invented. */
final class Invented {
    static final String FAMILY = "invented";
    static final Citation SOURCE = Citation.of("invented for a test", "p. 1");

    static final Family DISC = Family.of(FAMILY, "invented impeller")
            .description("invented for a test")
            .parameter(Dimensions.BLADE_COUNT.assumedAs("6", g -> 6))
            .parameter(Dimensions.BLADE_WIDTH.assumedAs("D/5", g -> g.get(Dimensions.IMPELLER_DIAMETER) / 5))
            .regimes(RegimeLimits.of(10, 1e4, SOURCE))
            .build();

    private Invented() {}

    /** A correlation that qualifies everywhere until the caller narrows it. */
    static CorrelationBuilder correlation(Quantity quantity, String id, Variable... reads) {
        CorrelationBuilder builder = Correlation.of(FAMILY + "." + id, quantity, id)
                .families(FAMILY).cite(SOURCE).transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .inClass(Classifier.BAFFLING, Classifier.BAFFLED, Classifier.UNBAFFLED)
                .reads(reads);
        return quantity.equals(Quantity.FLOW_NUMBER) ? builder.flow(FlowKind.DISCHARGE) : builder;
    }

    /** The same with a Reynolds number range that nothing leaves. */
    static CorrelationBuilder anywhere(Quantity quantity, String id, Variable... reads) {
        return correlation(quantity, id, reads).range(Measure.REYNOLDS, 1e-12, 1e12);
    }

    static Correlation constant(Quantity quantity, String id, double value) {
        return constant(quantity, id, value, b -> b);
    }

    static Correlation constant(
            Quantity quantity, String id, double value, UnaryOperator<CorrelationBuilder> narrower) {
        return narrower.apply(anywhere(quantity, id)).constant("a", value).formula("{a}")
                .relation((g, k) -> {
                    double a = k.get("a");
                    return p -> a;
                }).build();
    }

    static Correlation formula(CorrelationBuilder builder, String text, Relation relation) {
        return builder.formula(text).relation(relation).build();
    }

    static Catalogue catalogue(Correlation... correlations) {
        return Catalogue.of(List.of(Arrival.of(contribution(correlations), "invented.bundle 1.0.0")));
    }

    static Contribution contribution(Correlation... correlations) {
        return new Contribution() {
            @Override
            public List<Family> families() {
                return List.of(DISC);
            }

            @Override
            public List<Correlation> correlations() {
                return List.of(correlations);
            }
        };
    }

    /** A vessel with every dimension given, D = 0.5 m in T = 1.5 m, four baffles. */
    static Map<String, Double> vessel() {
        Map<String, Double> given = new HashMap<>();
        given.put("impeller_diameter", 0.5);
        given.put("vessel_diameter", 1.5);
        given.put("liquid_height", 1.5);
        given.put("clearance", 0.5);
        given.put("blade_count", 6.0);
        given.put("blade_width", 0.1);
        given.put("baffle_count", 4.0);
        given.put("baffle_width", 0.15);
        return given;
    }

    static Fluid fluid(FluidModel model) {
        return new Fluid(model, 1000, MeasuredWindow.UNKNOWN);
    }

    static CaseSpec at(double speed, FluidModel model) {
        return demand(new SpeedDemand.At(speed), model);
    }

    static CaseSpec demand(SpeedDemand demand, FluidModel model) {
        return new CaseSpec("case", FAMILY, vessel(), demand, fluid(model), Choices.NONE, List.of());
    }

    static CaseSpec water(Choices choices) {
        return new CaseSpec("case", FAMILY, vessel(), new SpeedDemand.At(2), fluid(new Newtonian(0.001)),
                choices, List.of());
    }

    static CandidateResult row(CaseResult result, String id) {
        return result.candidates().stream()
                .filter(c -> c.correlation().equals(FAMILY + "." + id) || c.correlation().equals(id))
                .findFirst().orElseThrow(() -> new AssertionError(id + " is not among " + ids(result)));
    }

    static List<String> ids(CaseResult result) {
        List<String> ids = new ArrayList<>();
        result.candidates().forEach(c -> ids.add(c.correlation().replace(FAMILY + ".", "")));
        return ids;
    }
}
