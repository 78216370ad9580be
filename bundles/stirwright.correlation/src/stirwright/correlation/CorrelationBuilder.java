package stirwright.correlation;

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
 * Collects a {@link Correlation}; {@link #build} checks that it is complete in itself. State every
 * bound that a reader would ask for or say {@link #notStated} with the reason: the conformance suite
 * asks for them.
 */
public final class CorrelationBuilder {

    /**
     * A single value that a source states is met within this fraction, since drawings are rounded:
     * common practice, no source.
     */
    private static final double NOMINAL = 0.025;

    private final Card card;
    private final Map<String, Double> constants = new LinkedHashMap<>();
    private final Map<String, ChartCurve> curves = new LinkedHashMap<>();
    private boolean anyFamily;

    CorrelationBuilder(Card card) {
        this.card = card;
    }

    /** The families it was made for, by id. */
    public CorrelationBuilder families(String... ids) {
        card.families.addAll(List.of(ids));
        return this;
    }

    /** It holds for every impeller. */
    public CorrelationBuilder anyFamily() {
        anyFamily = true;
        return this;
    }

    /**
     * For a modifier: when it has anything to say. Where it does not apply it is not used.
     *
     * @param test stateless; may be called from several threads at once
     */
    public CorrelationBuilder appliesWhen(String words, Predicate<Geometry> test) {
        card.applicability = new Applicability(words, test);
        return this;
    }

    public CorrelationBuilder cite(Citation source) {
        card.citation = source;
        return this;
    }

    /** How the coefficients were checked. */
    public CorrelationBuilder transcription(Transcription grade) {
        card.transcription = grade;
        return this;
    }

    public CorrelationBuilder standing(Standing value) {
        card.standing = value;
        return this;
    }

    /** What was checked against what, or a conflict with another source, in one sentence. */
    public CorrelationBuilder remark(String sentence) {
        card.remarks.add(sentence);
        return this;
    }

    public CorrelationBuilder reynolds(ReynoldsDefinition definition) {
        card.reynolds = definition;
        return this;
    }

    /** The id of the shear-rate constant that the source used with it. */
    public CorrelationBuilder belongsWith(String shearRateConstantId) {
        card.belongsWith = Optional.of(shearRateConstantId);
        return this;
    }

    public CorrelationBuilder contains(Effect... effects) {
        card.contains.addAll(List.of(effects));
        return this;
    }

    /** The variables of the operating point that the formula reads. */
    public CorrelationBuilder reads(Variable... variables) {
        card.reads.addAll(List.of(variables));
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

    /** A single value that the source states; rounding of 2.5 % counts as equal (common practice, no source). */
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

    /** The source has wall baffles. */
    public CorrelationBuilder baffled() {
        return inClass(Classifier.BAFFLING, Classifier.BAFFLED);
    }

    /** The source has so many wall baffles, each so wide as a share of the vessel diameter. */
    public CorrelationBuilder baffled(int count, double widthOverVessel) {
        return baffled().oneOf(Measure.BAFFLE_COUNT, count).nominal(Measure.B_OVER_T, widthOverVessel);
    }

    /** The source has no baffles. */
    public CorrelationBuilder unbaffled() {
        return inClass(Classifier.BAFFLING, Classifier.UNBAFFLED);
    }

    /** For an impeller that sweeps the wall: it has no baffles, by its type and not by the word of a source, and a remark says so. */
    public CorrelationBuilder noRoomForBaffles() {
        return unbaffled().remark(
                "No baffles: near the wall there is no room for them, so the type says it where the source does not.");
    }

    /** For a source with data of Newtonian fluids that is used for others too: no bound on the fluid, and why. */
    public CorrelationBuilder newtonianData() {
        return notStated(Classifier.FLUID,
                "Newtonian data; other fluids enter through Metzner and Otto's apparent viscosity");
    }

    /**
     * For a source that says "turbulent" and no number: the Reynolds number from which flow is
     * turbulent by {@link RegimeLimits#IN_GENERAL}, and a remark that says so.
     */
    public CorrelationBuilder turbulent() {
        RegimeLimits limits = RegimeLimits.IN_GENERAL;
        return atLeast(Measure.REYNOLDS, limits.turbulentFrom())
                .remark("The source says turbulent; the number " + Figures.show(limits.turbulentFrom()) + " is from "
                        + limits.citation() + ".");
    }

    private CorrelationBuilder bound(Bound bound) {
        card.demand(card.validity.stream().noneMatch(b -> b.subject().equals(bound.subject())),
                "a second bound on " + bound.subject().title());
        card.validity.add(bound);
        return this;
    }

    /** Relative scatter that the source gives, for instance 0.1 for plus or minus 10 %. */
    public CorrelationBuilder scatter(double relative) {
        card.demand(relative > 0 && relative < Double.POSITIVE_INFINITY, "scatter " + relative);
        card.scatter = OptionalDouble.of(relative);
        return this;
    }

    /** Mandatory for a flow number. */
    public CorrelationBuilder flow(FlowKind kind) {
        card.flowKind = Optional.of(kind);
        return this;
    }

    /**
     * Claims that value times Reynolds number tends to a constant at low Reynolds numbers; the
     * conformance suite checks it.
     */
    public CorrelationBuilder laminarLimit() {
        card.laminarLimit = true;
        return this;
    }

    /**
     * A coefficient of the formula.
     *
     * @param name letters and digits, a letter first
     */
    public CorrelationBuilder constant(String name, double value) {
        demandNewName(name);
        card.demand(Double.isFinite(value), "constant '" + name + "' is " + value);
        constants.put(name, value);
        return this;
    }

    /**
     * A curve of the formula.
     *
     * @param name letters and digits, a letter first
     * @param xy points in x, y pairs, read off a chart or printed as a table
     */
    public CorrelationBuilder curve(String name, double... xy) {
        demandNewName(name);
        curves.put(name, ChartCurve.through(xy));
        return this;
    }

    private void demandNewName(String name) {
        card.demand(!constants.containsKey(name) && !curves.containsKey(name),
                "a second constant or curve '" + name + "'");
    }

    /** The formula as people write it, with {@code {name}} for each constant and curve. */
    public CorrelationBuilder formula(String template) {
        card.formula = template;
        return this;
    }

    /** The formula as code. */
    public CorrelationBuilder relation(Relation code) {
        card.relation = code;
        return this;
    }

    /** For a correlation that is one number: constant, formula and relation at once. */
    public CorrelationBuilder value(String name, double number) {
        return constant(name, number)
                .formula(card.quantity.symbol() + " = {" + name + "}")
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
                .formula(card.quantity.symbol() + " = {" + name + "}/Re")
                .relation((geometry, k) -> {
                    double value = k.get(name);
                    return point -> value / point.reynolds();
                });
    }

    /**
     * The correlation as told so far; it does not change when the builder is used further. What is
     * demanded here never grows stricter in a minor version of the contract; the conformance suite
     * asks for more.
     *
     * @throws ContractException naming the correlation and what is missing or contradictory
     */
    public Correlation build() {
        card.demandId();
        card.demand(anyFamily != !card.families.isEmpty(), "say either families(...) or anyFamily()");
        card.demand(card.citation != null, "has no citation");
        card.demand(card.transcription != null, "has no transcription");
        card.demand(card.formula != null && card.relation != null, "has no formula or no relation");
        boolean modifier = card.modifierFor.isPresent();
        card.demand(card.quantity.equals(Quantity.FLOW_NUMBER) == card.flowKind.isPresent() || modifier,
                "a flow number, and nothing else, says discharge or circulation");
        card.demand(modifier || card.applicability == Applicability.ALWAYS, "appliesWhen(...) is for a modifier");
        Set<String> names = new LinkedHashSet<>(constants.keySet());
        names.addAll(curves.keySet());
        card.demand(FormulaText.slots(card.formula).equals(names),
                "the formula names " + FormulaText.slots(card.formula) + ", the constants are " + names);
        card.constants = new Constants(constants, curves);
        return new Correlation(card);
    }
}
