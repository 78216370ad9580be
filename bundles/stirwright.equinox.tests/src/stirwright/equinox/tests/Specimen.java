package stirwright.equinox.tests;

import java.util.List;
import stirwright.conformance.ReferenceFile;
import stirwright.conformance.Subject;
import stirwright.core.Arrival;
import stirwright.core.Catalogue;
import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Family;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** A contribution that passes every check, in pieces, so that a test breaks one of them. Invented for a test. */
final class Specimen {
    static final String ORIGIN = "invented.specimen 1.0.0";
    static final String POWER = "specimen.np.invented";
    static final String KS = "specimen.ks.invented";
    static final String FACTOR = "specimen.np.invented-factor";
    static final Citation SOURCE = Citation.of("Invented for a test (2025)", "p. 1");

    static final String HEADER = """
            # Invented for a test: the formula worked by hand, in a vessel of D 0.3 m and T 0.9 m.
            correlation,family,kind,expected,source,outside,impeller_diameter_m,baffle_count,reynolds,flow_index,\
            impeller_count
            """;
    /** 60/100 + 1.5 */
    static final String POWER_ROW = row(POWER, "formula,2.1,60/100 + 1.5", "100,,");
    static final String KS_ROW = row(KS, "recalled,11,the number itself", "100,,");
    /** 2 times 0.9 */
    static final String FACTOR_ROW = row(FACTOR, "formula,1.8,2 * 0.9", "100,,2");

    private Specimen() {}

    /**
     * A row for the specimen's family with D 0.3 m and four baffles.
     *
     * @param what kind, expected number and source
     * @param values of Reynolds number, flow index and impeller count
     */
    static String row(String correlation, String what, String values) {
        return correlation + ",," + what + ",,0.3,4," + values + "\n";
    }

    static Family.Builder family(String id) {
        return Family.of(id, "specimen").description("Invented for a test.").regimes(RegimeLimits.of(10, 1e4, SOURCE));
    }

    static CorrelationBuilder described(CorrelationBuilder builder) {
        return builder.families("specimen").cite(SOURCE).transcription(Transcription.CHECKED_AGAINST_SOURCE);
    }

    static CorrelationBuilder bounded(CorrelationBuilder builder) {
        return withoutFluid(builder).notStated(Classifier.FLUID, "invented without a fluid");
    }

    static CorrelationBuilder withoutFluid(CorrelationBuilder builder) {
        return ranges(builder).inClass(Classifier.BAFFLING, Classifier.BAFFLED, Classifier.UNBAFFLED);
    }

    static CorrelationBuilder withoutBaffling(CorrelationBuilder builder) {
        return ranges(builder).notStated(Classifier.FLUID, "invented without a fluid");
    }

    private static CorrelationBuilder ranges(CorrelationBuilder builder) {
        return builder.range(Measure.REYNOLDS, 1, 1e5).range(Measure.D_OVER_T, 0.2, 0.5);
    }

    static CorrelationBuilder start() {
        return Correlation.of(POWER, Quantity.POWER_NUMBER, "invented");
    }

    /** Np = 60/Re + 1.5, without its relation. */
    static CorrelationBuilder power() {
        return formula(bounded(described(start())));
    }

    static CorrelationBuilder formula(CorrelationBuilder builder) {
        return builder.reads(Variable.REYNOLDS).constant("a", 60).constant("b", 1.5).formula("Np = {a}/Re + {b}");
    }

    static Correlation sound(CorrelationBuilder builder) {
        return builder.relation((g, k) -> p -> k.get("a") / p.reynolds() + k.get("b")).build();
    }

    static CorrelationBuilder ks() {
        return bounded(described(Correlation.of(KS, Quantity.SHEAR_RATE_CONSTANT, "invented")))
                .constant("ks", 11).formula("ks = {ks}").relation((g, k) -> p -> k.get("ks"));
    }

    static CorrelationBuilder factor() {
        return bounded(described(Correlation.modifier(
                        FACTOR, Quantity.POWER_NUMBER, Effect.SEVERAL_IMPELLERS, "invented")))
                .notStated(Measure.IMPELLER_COUNT, "invented without a range")
                .constant("f", 0.9).formula("{f} ni")
                .relation((g, k) -> p -> k.get("f") * g.get(Dimensions.IMPELLER_COUNT));
    }

    static CorrelationBuilder whenSeveral(CorrelationBuilder modifier) {
        return modifier.appliesWhen("more than one impeller", g -> g.get(Dimensions.IMPELLER_COUNT) > 1);
    }

    /** The specimen's family with these correlations and rows. */
    static Subject subject(String rows, Correlation... correlations) {
        return subject(List.of(family("specimen").build()), HEADER + rows, Catalogue.of(List.of()), correlations);
    }

    static Subject subject(List<Family> families, String file, Catalogue others, Correlation... correlations) {
        return Subject.of(ORIGIN, List.of(Arrival.of(contribution(families, correlations), ORIGIN)),
                List.of(new ReferenceFile("rows.csv", file)), others);
    }

    static Contribution contribution(List<Family> families, Correlation... correlations) {
        return new Contribution() {
            @Override
            public List<Family> families() {
                return families;
            }

            @Override
            public List<Correlation> correlations() {
                return List.of(correlations);
            }
        };
    }
}
