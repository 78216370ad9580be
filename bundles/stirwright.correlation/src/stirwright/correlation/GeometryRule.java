package stirwright.correlation;

import java.util.List;
import java.util.function.Function;
import java.util.function.Predicate;

/**
 * A hard limit between dimensions: a geometry that breaks it does not exist, and the case is
 * refused. Families make rules through {@link Family.Builder}.
 */
public final class GeometryRule {
    private final List<GeometryParameter> parameters;
    private final Function<Geometry, String> words;
    private final Predicate<Geometry> test;

    private GeometryRule(List<GeometryParameter> parameters, Function<Geometry, String> words, Predicate<Geometry> test) {
        this.parameters = parameters;
        this.words = words;
        this.test = test;
    }

    static GeometryRule of(GeometryParameter named, String words, Predicate<Geometry> test) {
        return new GeometryRule(List.of(named), g -> words, test);
    }

    /** Says "below", since equal sizes touch. */
    static GeometryRule below(GeometryParameter smaller, GeometryParameter larger, double share) {
        if (!(share > 0)) {
            throw new ContractException(smaller.id() + " below " + share + " times " + larger.id());
        }
        String times = share == 1 ? "" : Figures.show(share) + " times ";
        return new GeometryRule(List.of(smaller, larger),
                g -> "below " + times + larger.column() + " " + Figures.show(larger.toColumn(g.get(larger))),
                g -> g.get(smaller) < share * g.get(larger));
    }

    /** The parameters that it names; a family that lacks one of them does without the rule. */
    List<GeometryParameter> parameters() {
        return parameters;
    }

    /** The parameter whose value is refused when the rule is broken. */
    public GeometryParameter named() {
        return parameters.get(0);
    }

    public boolean holds(Geometry geometry) {
        return test.test(geometry);
    }

    /** What the named parameter must be, as said after "is not": for instance "below vessel_diameter_m 1.5". */
    public String words(Geometry geometry) {
        return words.apply(geometry);
    }
}
