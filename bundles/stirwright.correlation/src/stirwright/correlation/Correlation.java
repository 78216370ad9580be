package stirwright.correlation;

import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * One published or in-house relation for one quantity: the formula with its constants, the range in
 * which it holds, the source, and what is known of its trustworthiness. Immutable.
 *
 * <p>A correlation for an {@link Effect} is a modifier: its value multiplies the quantity of a
 * correlation that does not contain that effect.
 */
public final class Correlation {
    private final CorrelationBuilder from;
    private final Constants constants;

    Correlation(CorrelationBuilder from, Constants constants) {
        this.from = from;
        this.constants = constants;
    }

    /**
     * Starts a correlation.
     *
     * @param id unique in the world: family, quantity and source, for instance {@code
     *     "pitchedblade.np.medek-1980"}
     */
    public static CorrelationBuilder of(String id, Quantity quantity, String title) {
        return new CorrelationBuilder(id, quantity, Optional.empty(), title);
    }

    /** Starts a modifier: a factor on a quantity that accounts for one effect. */
    public static CorrelationBuilder modifier(String id, Quantity quantity, Effect effect, String title) {
        return new CorrelationBuilder(id, quantity, Optional.of(effect), title);
    }

    public String id() {
        return from.id;
    }

    public Quantity quantity() {
        return from.quantity;
    }

    /** The effect that this modifier accounts for; empty for a correlation of its own. */
    public Optional<Effect> modifierFor() {
        return from.modifierFor;
    }

    public String title() {
        return from.title;
    }

    /** Whether it was made for impellers of this family. */
    public boolean holdsFor(String familyId) {
        return from.families.isEmpty() || from.families.contains(familyId);
    }

    /** The families it was made for; empty when it holds for any. */
    public Set<String> families() {
        return Collections.unmodifiableSet(from.families);
    }

    /** Whether a modifier has anything to say about this geometry. */
    public boolean appliesTo(Geometry geometry) {
        return from.applicability.test().test(geometry);
    }

    /** When it applies, in words; "always" for most. */
    public String appliesWhen() {
        return from.applicability.words();
    }

    public ReynoldsDefinition reynoldsDefinition() {
        return from.reynolds;
    }

    /** The shear-rate constant with which the source used it, if the source says so. */
    public Optional<String> belongsWith() {
        return from.belongsWith;
    }

    /** The effects that it already contains. */
    public Set<Effect> contains() {
        return Collections.unmodifiableSet(from.contains);
    }

    /** The variables that the formula reads. */
    public Set<Variable> reads() {
        return Collections.unmodifiableSet(from.reads);
    }

    public List<Bound> validity() {
        return Collections.unmodifiableList(from.validity);
    }

    /** The bound on a measure or classifier, stated or not. */
    public Optional<Bound> bound(Term subject) {
        return from.validity.stream().filter(b -> b.subject().equals(subject)).findFirst();
    }

    /** Relative scatter that the source gives, for instance 0.1 for plus or minus 10 %. */
    public OptionalDouble scatter() {
        return from.scatter;
    }

    public Citation citation() {
        return from.citation;
    }

    public Standing standing() {
        return from.standing;
    }

    public Transcription transcription() {
        return from.transcription;
    }

    /** What was checked against what, and known conflicts with other sources, in sentences. */
    public List<String> remarks() {
        return Collections.unmodifiableList(from.remarks);
    }

    /** Present for every flow number. */
    public Optional<FlowKind> flowKind() {
        return from.flowKind;
    }

    /** Whether it claims that value times Reynolds number is constant at the low end of its range. */
    public boolean claimsLaminarLimit() {
        return from.laminarLimit;
    }

    public Constants constants() {
        return constants;
    }

    /** The same correlation with other constants, for an editor and for sensitivity. */
    public Correlation withConstants(Constants others) {
        return new Correlation(from, others);
    }

    /** The formula, printed from the constants that {@link #bind} computes with. */
    public String formula() {
        return FormulaText.print(from.formula, constants);
    }

    public BoundCorrelation bind(Geometry geometry) {
        return from.relation.bind(geometry, constants);
    }

    @Override
    public String toString() {
        return id();
    }
}
