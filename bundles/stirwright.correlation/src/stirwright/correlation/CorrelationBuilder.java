package stirwright.correlation;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.Predicate;

/**
 * Collects a {@link Correlation}; {@link #build} checks that nothing is missing. Every bound that a
 * reader would ask for is either stated or {@link #notStated} with the reason.
 */
public final class CorrelationBuilder {

    /** A single value that a source states is met within this fraction: drawings are rounded. */
    private static final double NOMINAL = 0.025;

    final String id;
    final Quantity quantity;
    final Optional<Effect> modifierFor;
    final String title;
    final List<Bound> validity = new ArrayList<>();
    final Set<Effect> contains = new LinkedHashSet<>();
    final Set<Variable> reads = new LinkedHashSet<>();
    final List<String> remarks = new ArrayList<>();
    final Set<String> families = new LinkedHashSet<>();
    Applicability applicability = Applicability.ALWAYS;
    ReynoldsDefinition reynolds = ReynoldsDefinition.METZNER_OTTO;
    Optional<String> belongsWith = Optional.empty();
    OptionalDouble scatter = OptionalDouble.empty();
    Standing standing = Standing.PUBLISHED;
    Optional<FlowKind> flowKind = Optional.empty();
    boolean laminarLimit;
    Citation citation;
    Transcription transcription;
    String formula;
    Relation relation;
    private final Map<String, Double> constants = new LinkedHashMap<>();
    private final Map<String, ChartCurve> curves = new LinkedHashMap<>();
    private boolean anyFamily;
    private boolean built;

    CorrelationBuilder(String id, Quantity quantity, Optional<Effect> modifierFor, String title) {
        this.id = id;
        this.quantity = quantity;
        this.modifierFor = modifierFor;
        this.title = title;
    }

    /** The families it was made for, by id. */
    public CorrelationBuilder families(String... ids) {
        families.addAll(List.of(ids));
        return this;
    }

    /** It holds for every impeller. */
    public CorrelationBuilder anyFamily() {
        anyFamily = true;
        return this;
    }

    /** For a modifier: when it has anything to say. Where it does not apply it is not used. */
    public CorrelationBuilder appliesWhen(String words, Predicate<Geometry> test) {
        applicability = new Applicability(words, test);
        return this;
    }

    public CorrelationBuilder cite(Citation source) {
        citation = source;
        return this;
    }

    /** How the coefficients were checked. */
    public CorrelationBuilder transcription(Transcription grade) {
        transcription = grade;
        return this;
    }

    public CorrelationBuilder standing(Standing value) {
        standing = value;
        return this;
    }

    /** What was checked against what, or a conflict with another source, in one sentence. */
    public CorrelationBuilder remark(String sentence) {
        remarks.add(sentence);
        return this;
    }

    public CorrelationBuilder reynolds(ReynoldsDefinition definition) {
        reynolds = definition;
        return this;
    }

    /** The id of the shear-rate constant that the source used with it. */
    public CorrelationBuilder belongsWith(String shearRateConstantId) {
        belongsWith = Optional.of(shearRateConstantId);
        return this;
    }

    public CorrelationBuilder contains(Effect... effects) {
        contains.addAll(List.of(effects));
        return this;
    }

    /** The variables of the operating point that the formula reads. */
    public CorrelationBuilder reads(Variable... variables) {
        reads.addAll(List.of(variables));
        return this;
    }

    /** A closed range that the source states. */
    public CorrelationBuilder range(Measure measure, double least, double most) {
        return range(measure, least, most, "");
    }

    /** A closed range, with a word on where a limit comes from when the source has none in figures. */
    public CorrelationBuilder range(Measure measure, double least, double most, String remark) {
        return bound(new Bound.Range(measure, least, most, remark));
    }

    public CorrelationBuilder atLeast(Measure measure, double least) {
        return range(measure, least, Double.POSITIVE_INFINITY);
    }

    public CorrelationBuilder atMost(Measure measure, double most) {
        return range(measure, Double.NEGATIVE_INFINITY, most);
    }

    /** A single value that the source states; rounding of 2.5 % counts as equal. */
    public CorrelationBuilder nominal(Measure measure, double value) {
        double margin = NOMINAL * Math.abs(value);
        return bound(new Bound.Range(
                measure, value - margin, value + margin, "nominal " + Figures.show(value)));
    }

    /** Counts that the source states. */
    public CorrelationBuilder oneOf(Measure measure, double... allowed) {
        return bound(new Bound.OneOf(measure, Arrays.stream(allowed).boxed().toList()));
    }

    /** Classes that the source states, by label. */
    public CorrelationBuilder inClass(Classifier classifier, String... allowed) {
        return bound(new Bound.InClass(classifier, List.of(allowed)));
    }

    public CorrelationBuilder fluids(FluidClass... allowed) {
        return inClass(Classifier.FLUID, Arrays.stream(allowed).map(FluidClass::id).toArray(String[]::new));
    }

    /** A bound that the source does not give, or that nobody here could read: no pass, no failure. */
    public CorrelationBuilder notStated(Term subject, String reason) {
        return bound(new Bound.NotStated(subject, reason));
    }

    private CorrelationBuilder bound(Bound bound) {
        if (validity.stream().anyMatch(b -> b.subject().equals(bound.subject()))) {
            throw new ContractException(id + ": a second bound on " + bound.subject().title());
        }
        validity.add(bound);
        return this;
    }

    /** Relative scatter that the source gives, for instance 0.1. */
    public CorrelationBuilder scatter(double relative) {
        scatter = OptionalDouble.of(relative);
        return this;
    }

    /** Mandatory for a flow number. */
    public CorrelationBuilder flow(FlowKind kind) {
        flowKind = Optional.of(kind);
        return this;
    }

    /** Claims that value times Reynolds number tends to a constant; the conformance suite checks it. */
    public CorrelationBuilder laminarLimit() {
        laminarLimit = true;
        return this;
    }

    public CorrelationBuilder constant(String name, double value) {
        constants.put(name, value);
        return this;
    }

    /** Points in x, y pairs, read off a chart or printed as a table. */
    public CorrelationBuilder curve(String name, double... xy) {
        curves.put(name, ChartCurve.through(xy));
        return this;
    }

    /** The formula as people write it, with {@code {name}} for each constant and curve. */
    public CorrelationBuilder formula(String template) {
        formula = template;
        return this;
    }

    public CorrelationBuilder relation(Relation code) {
        relation = code;
        return this;
    }

    /** For a correlation that is one number: constant, formula and relation at once. */
    public CorrelationBuilder value(String name, double number) {
        return constant(name, number)
                .formula(quantity.symbol() + " = {" + name + "}")
                .relation((geometry, k) -> {
                    double value = k.get(name);
                    return point -> value;
                });
    }

    /** For a laminar law, one number over the Reynolds number: constant, formula, relation and claim at once. */
    public CorrelationBuilder overReynolds(String name, double number) {
        return constant(name, number)
                .reads(Variable.REYNOLDS)
                .laminarLimit()
                .formula(quantity.symbol() + " = {" + name + "}/Re")
                .relation((geometry, k) -> {
                    double value = k.get(name);
                    return point -> value / point.reynolds();
                });
    }

    /** @throws ContractException naming the correlation and what is missing or contradictory */
    public Correlation build() {
        demand(!built, "is built already");
        demand(id.matches("[a-z][a-z0-9]*(\\.[a-z0-9]+(-[a-z0-9]+)*)+"),
                "the id must be lower-case words joined by '.' and '-'");
        demand(anyFamily != !families.isEmpty(), "say either families(...) or anyFamily()");
        demand(citation != null, "has no citation");
        demand(transcription != null, "has no transcription");
        demand(formula != null && relation != null, "has no formula or no relation");
        demand(quantity.equals(Quantity.FLOW_NUMBER) == flowKind.isPresent() || modifierFor.isPresent(),
                "a flow number, and nothing else, says discharge or circulation");
        Set<String> names = new LinkedHashSet<>(constants.keySet());
        names.addAll(curves.keySet());
        demand(names.size() == constants.size() + curves.size(), "a constant and a curve share a name");
        demand(FormulaText.slots(formula).equals(names),
                "the formula names " + FormulaText.slots(formula) + ", the constants are " + names);
        built = true;
        return new Correlation(this, new Constants(constants, curves));
    }

    private void demand(boolean met, String otherwise) {
        if (!met) {
            throw new ContractException("correlation '" + id + "': " + otherwise);
        }
    }
}
