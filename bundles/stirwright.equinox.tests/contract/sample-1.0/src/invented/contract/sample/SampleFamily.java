package invented.contract.sample;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Family;
import stirwright.correlation.FluidClass;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.GeometryParameter.Kind;
import stirwright.correlation.Measure;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Standing;
import stirwright.correlation.Transcription;

/** The family, the words of its own, and what all of its correlations say alike. */
final class SampleFamily {
    static final String ID = "sampleblade";
    static final Citation SOURCE = Citation.of("Invented for a test of the contract (2025)", "no page: nothing was measured");

    static final GeometryParameter WEB_WIDTH = GeometryParameter
            .of("web_width", "web width", Kind.LENGTH, "w", "width of the web between two blades")
            .withLimits(0.001, 2)
            .assumedAs("D/8", g -> g.get(Dimensions.IMPELLER_DIAMETER) / 8);

    /** Follows from what the family lists after it, where that was given; else from what it lists before. */
    static final GeometryParameter WEB_HEIGHT = GeometryParameter
            .of("web_height", "web height", Kind.LENGTH, "hw", "height of the web")
            .derivedAs("s - w", g -> g.get(SampleFamily.WEB_SPAN) - g.get(WEB_WIDTH))
            .assumedAs("2 w", g -> 2 * g.get(WEB_WIDTH));

    static final GeometryParameter WEB_SPAN = GeometryParameter
            .of("web_span", "web span", Kind.LENGTH, "s", "width and height of the web together")
            .derivedAs("w + hw", g -> g.get(WEB_WIDTH) + g.get(WEB_HEIGHT));

    static final GeometryParameter SLOT_COUNT = GeometryParameter
            .of("slot_count", "slot count", Kind.COUNT, "ns", "slots in one web")
            .withLimits(0, 9)
            .usually("0", g -> 0);

    static final Effect SLOTS = Effect.of("web-slots", "slots in the web");
    static final Measure WEB_OVER_D = Measure.ratio(WEB_WIDTH, Dimensions.IMPELLER_DIAMETER);
    static final Measure WEB_AREA = Measure.of("web_area", "web area in m2", (g, p) -> g.get(WEB_WIDTH) * g.get(WEB_HEIGHT));
    static final Measure WEB_REYNOLDS = Measure.of("web_reynolds", "web Reynolds number",
            (g, p) -> p.reynolds() * Math.pow(g.ratio(WEB_WIDTH, Dimensions.IMPELLER_DIAMETER), 2)).byFactor();
    static final Classifier WEB = Classifier.of("web", "web",
            (g, p) -> g.ratio(WEB_WIDTH, Dimensions.IMPELLER_DIAMETER) < 0.2 ? "narrow" : "wide");

    private SampleFamily() {}

    static Family describe() {
        return Family.of(ID, "sample impeller")
                .description("Invented for a test: four blades at 45 degrees with webs between them.")
                .parameter(Dimensions.VESSEL_DIAMETER.assumedAs("2 D", g -> 2 * g.get(Dimensions.IMPELLER_DIAMETER)))
                .parameter(Dimensions.BLADE_COUNT.assumedAs("4", g -> 4))
                .parameter(Dimensions.BLADE_ANGLE.withMeaning("to the horizontal").assumedAs("45", g -> Math.PI / 4))
                .parameter(WEB_WIDTH)
                .parameter(WEB_HEIGHT)
                .parameter(WEB_SPAN)
                .parameter(SLOT_COUNT)
                .below(WEB_WIDTH, Dimensions.IMPELLER_DIAMETER, 0.5)
                .rule(SLOT_COUNT, "an even number", g -> g.get(SLOT_COUNT) % 2 == 0)
                .regimes(RegimeLimits.of(10, 1000, SOURCE))
                .build();
    }

    static CorrelationBuilder card(CorrelationBuilder builder) {
        return builder.cite(SOURCE)
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .standing(Standing.APPROVED)
                .remark("Invented for a test.");
    }

    /** Bounds that say nothing but exist. */
    static CorrelationBuilder loose(CorrelationBuilder builder) {
        return card(builder)
                .range(Measure.REYNOLDS, 0.1, 1e6)
                .inClass(Classifier.BAFFLING, Classifier.BAFFLED, Classifier.UNBAFFLED)
                .notStated(Measure.D_OVER_T, "invented without a range")
                .fluids(FluidClass.NEWTONIAN, FluidClass.SHEAR_THINNING, FluidClass.YIELD_STRESS);
    }
}
