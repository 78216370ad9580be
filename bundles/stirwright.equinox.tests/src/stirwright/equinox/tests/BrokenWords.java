package stirwright.equinox.tests;

import static stirwright.equinox.tests.Specimen.FACTOR_ROW;
import static stirwright.equinox.tests.Specimen.HEADER;
import static stirwright.equinox.tests.Specimen.KS;
import static stirwright.equinox.tests.Specimen.KS_ROW;
import static stirwright.equinox.tests.Specimen.POWER;
import static stirwright.equinox.tests.Specimen.POWER_ROW;
import static stirwright.equinox.tests.Specimen.sound;
import static stirwright.equinox.tests.Specimen.subject;

import java.util.List;
import stirwright.conformance.Subject;
import stirwright.core.Arrival;
import stirwright.core.Catalogue;
import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.equinox.tests.BrokenContributionsTest.Broken;

/** Contributions that say something wrong, or nothing. */
final class BrokenWords {
    private static final Catalogue NOBODY = Catalogue.of(List.of());

    private BrokenWords() {}

    static List<Broken> all() {
        return List.of(
                new Broken("answers", "a flow number without its kind", throwing(),
                        "specimen.nq.invented", "discharge or circulation"),
                new Broken("answers", "an empty contribution", Subject.of(Specimen.ORIGIN,
                        List.of(Arrival.of(List::of, Specimen.ORIGIN)), List.of(), NOBODY), "neither a family nor"),
                new Broken("ids", "one id twice", subject(POWER_ROW, sound(Specimen.power()), sound(Specimen.power())),
                        POWER, "two correlations"),
                new Broken("ids", "an id that is taken", subject(List.of(family()), HEADER + POWER_ROW,
                        others(List.of(), sound(Specimen.power())), sound(Specimen.power())), POWER, "somebody.else 2.0.0"),
                new Broken("ids", "a family that is taken", subject(List.of(family()), HEADER + POWER_ROW,
                        others(List.of(family())), sound(Specimen.power())), "specimen", "somebody.else 2.0.0"),
                new Broken("ids", "a family twice", subject(List.of(family(), family()), HEADER + POWER_ROW, NOBODY,
                        sound(Specimen.power())), "specimen", "twice"),
                new Broken("ids", "no source in the id", named("specimen.invented"), "three parts"),
                new Broken("ids", "another first word", named("somebody.np.invented"), "'somebody'"),
                new Broken("citation", "a locator that leads nowhere", cited(Citation.of("Nobody (1900)", "n/a")), "'n/a'"),
                new Broken("citation", "the words not exactly", cited(Citation.of("Nobody (1900)", "not at hand")),
                        "'not at hand'", "locator not at hand"),
                new Broken("citation", "no author", cited(Citation.of("??", "p. 3")), "'??'"),
                new Broken("bounds", "nothing of the fluid", subject(POWER_ROW, sound(Specimen.formula(
                        Specimen.withoutFluid(Specimen.described(Specimen.start()))))), POWER, "fluid"),
                new Broken("bounds", "a baffle count in place of the class", subject(POWER_ROW, sound(Specimen.formula(
                        Specimen.withoutBaffling(Specimen.described(Specimen.start())).oneOf(Measure.BAFFLE_COUNT, 4)))),
                        POWER, "Classifier.BAFFLING"),
                new Broken("bounds", "a reason that is none", subject(POWER_ROW, sound(Specimen.formula(Specimen
                        .withoutFluid(Specimen.described(Specimen.start())).notStated(Classifier.FLUID, "?")))), "'?'"),
                new Broken("spoken of", "a dimension that no bound speaks of", subject(POWER_ROW, Specimen.power()
                        .relation((g, k) -> p -> (k.get("a") / p.reynolds() + k.get("b"))
                                * (g.get(Dimensions.CLEARANCE) > 0 ? 1 : 2)).build()), POWER, "clearance"),
                new Broken("names", "a shear-rate constant that is not there",
                        subject(POWER_ROW, sound(Specimen.power().belongsWith(KS))), KS, "not installed"),
                new Broken("names", "a shear-rate constant that is none",
                        subject(POWER_ROW, sound(Specimen.power().belongsWith(POWER))), "power number"),
                new Broken("family geometry", "a default that reads what comes later", subject(
                        List.of(family(), outOfOrder()), HEADER + POWER_ROW, NOBODY, sound(Specimen.power())),
                        "outoforder", "blade_length_m"),
                new Broken("formula", "a slot that is none", subject(KS_ROW, Specimen.ks().formula("ks = {ks} {k_s}").build()),
                        KS, "{k_s}"),
                new Broken("applicability", "a modifier that does not say when",
                        subject(FACTOR_ROW, Specimen.factor().build()), "appliesWhen"));
    }

    private static Family family() {
        return Specimen.family("specimen").build();
    }

    private static Family outOfOrder() {
        return Specimen.family("outoforder")
                .parameter(Dimensions.BLADE_LENGTH.assumedAs("W", g -> g.get(Dimensions.BLADE_WIDTH)))
                .parameter(GeometryParameter.of("blade_width", "blade width", GeometryParameter.Kind.LENGTH, "W", "width")
                        .assumedAs("D/5", g -> g.get(Dimensions.IMPELLER_DIAMETER) / 5))
                .build();
    }

    private static Catalogue others(List<Family> families, Correlation... correlations) {
        return Catalogue.of(List.of(Arrival.of(Specimen.contribution(families, correlations), "somebody.else 2.0.0")));
    }

    private static Subject named(String id) {
        CorrelationBuilder builder = Correlation.of(id, Quantity.POWER_NUMBER, "invented");
        return subject(POWER_ROW.replace(POWER, id), sound(Specimen.formula(Specimen.bounded(Specimen.described(builder)))));
    }

    private static Subject cited(Citation citation) {
        return subject(POWER_ROW, sound(Specimen.power().cite(citation)));
    }

    private static Subject throwing() {
        Contribution contribution = () -> List.of(Specimen.bounded(Specimen.described(
                        Correlation.of("specimen.nq.invented", Quantity.FLOW_NUMBER, "invented")))
                .formula("Nq = 1").relation((g, k) -> p -> 1).build());
        return Subject.of(Specimen.ORIGIN, List.of(Arrival.of(contribution, Specimen.ORIGIN)), List.of(), NOBODY);
    }
}
