package stirwright.correlation;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Stream;

/**
 * One published or in-house relation for one quantity: the formula with its constants, the range in
 * which it holds, the source, and what is known of its trustworthiness. Immutable.
 * Its sets keep the order in which the builder was told.
 *
 * <p>A correlation for an {@link Effect} is a modifier: its value multiplies the quantity of a
 * correlation that does not contain that effect.
 */
public final class Correlation {
    private final Card card;

    Correlation(Card card) {
        this.card = new Card(card);
    }

    /**
     * Starts a correlation.
     *
     * @param id unique in the world: family, quantity and source, for instance {@code
     *     "pitchedblade.np.medek-1980"}
     */
    public static CorrelationBuilder of(String id, Quantity quantity, String title) {
        return new CorrelationBuilder(new Card(id, quantity, Optional.empty(), title));
    }

    /** Starts a modifier: a factor on a quantity that accounts for one effect. */
    public static CorrelationBuilder modifier(String id, Quantity quantity, Effect effect, String title) {
        return new CorrelationBuilder(new Card(id, quantity, Optional.of(effect), title));
    }

    public String id() {
        return card.id;
    }

    public Quantity quantity() {
        return card.quantity;
    }

    /** The effect that this modifier accounts for; empty for a correlation of its own. */
    public Optional<Effect> modifierFor() {
        return card.modifierFor;
    }

    public String title() {
        return card.title;
    }

    /** Whether it was made for impellers of this family. */
    public boolean holdsFor(String familyId) {
        return card.families.isEmpty() || card.families.contains(familyId);
    }

    /** The families it was made for; empty when it holds for any. */
    public Set<String> families() {
        return card.families;
    }

    /** Whether a modifier has anything to say about this geometry. */
    public boolean appliesTo(Geometry geometry) {
        return card.applicability.test().test(geometry);
    }

    /** When it applies, in words; "always" for most. */
    public String appliesWhen() {
        return card.applicability.words();
    }

    public ReynoldsDefinition reynoldsDefinition() {
        return card.reynolds;
    }

    /** The shear-rate constant with which the source used it, if the source says so. */
    public Optional<String> belongsWith() {
        return card.belongsWith;
    }

    /** The effects that it already contains. */
    public Set<Effect> contains() {
        return card.contains;
    }

    /** The variables that the formula reads. */
    public Set<Variable> reads() {
        return card.reads;
    }

    public List<Bound> validity() {
        return card.validity;
    }

    /** The bound on a measure or classifier, stated or not. */
    public Optional<Bound> bound(Term subject) {
        return card.validity.stream().filter(b -> b.subject().equals(subject)).findFirst();
    }

    /** Relative scatter that the source gives, for instance 0.1 for plus or minus 10 %. */
    public OptionalDouble scatter() {
        return card.scatter;
    }

    public Citation citation() {
        return card.citation;
    }

    public Standing standing() {
        return card.standing;
    }

    public Transcription transcription() {
        return card.transcription;
    }

    /** What was checked against what, and known conflicts with other sources, in sentences. */
    public List<String> remarks() {
        return card.remarks;
    }

    /** Present for every flow number. */
    public Optional<FlowKind> flowKind() {
        return card.flowKind;
    }

    /** Whether it claims that value times Reynolds number tends to a constant at low Reynolds numbers. */
    public boolean claimsLaminarLimit() {
        return card.laminarLimit;
    }

    public Constants constants() {
        return card.constants;
    }

    /**
     * A correlation like this one with other constants, for an editor and for sensitivity: an
     * {@linkplain Standing#IN_HOUSE_DRAFT in-house draft} with a remark that says what it was
     * changed from. All else stays, so whoever edits it further says so in the source.
     *
     * @param newId another id than this one's
     * @param constants made from {@link #constants()}: the same names of constants and curves
     * @throws ContractException when the id or the names are not as demanded
     */
    public Correlation variant(String newId, Constants constants) {
        Card changed = new Card(card);
        changed.id = newId;
        changed.demandId();
        changed.demand(!newId.equals(id()), "a variant needs an id of its own");
        changed.demand(constants.names().equals(card.constants.names())
                        && constants.curveNames().equals(card.constants.curveNames()),
                "has constants " + constants.names() + " and curves " + constants.curveNames() + ", " + id() + " has "
                        + card.constants.names() + " and " + card.constants.curveNames());
        changed.constants = constants;
        changed.standing = Standing.IN_HOUSE_DRAFT;
        changed.remarks = Stream.concat(card.remarks.stream(), Stream.of("Constants changed from " + id() + ".")).toList();
        return new Correlation(changed);
    }

    /** The formula, printed from the constants that {@link #bind} computes with. */
    public String formula() {
        return FormulaText.print(card.formula, card.constants);
    }

    /** The formula with the names of constants and curves in place of their values. */
    public String formulaByName() {
        return FormulaText.names(card.formula);
    }

    /**
     * The relation, bound to a geometry. May be called from several threads at once; what it returns
     * is for one thread at a time.
     */
    public BoundCorrelation bind(Geometry geometry) {
        return card.relation.bind(geometry, card.constants);
    }

    @Override
    public String toString() {
        return id();
    }
}
